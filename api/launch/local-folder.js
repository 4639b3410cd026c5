import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** Root of the project. */
export const projectFolder = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');
/** Ignored folder with what a start on this machine makes; DROPWATT_LOCAL names another, so that two can run side by side. */
export const localFolder = process.env.DROPWATT_LOCAL || join(projectFolder, '.local');
export const clusterFolder = join(localFolder, 'postgres');
export const mailFolder = join(localFolder, 'mail');
/** What was last installed and built belongs to the project, not to one start of it. */
export const stampFolder = join(projectFolder, '.local', 'stamps');

import { fileURLToPath } from 'node:url';
import { join } from 'node:path';

/** Root of the project, and the ignored folder that holds what a start on this machine makes. */
export const projectFolder = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');
export const localFolder = join(projectFolder, '.local');
export const clusterFolder = join(localFolder, 'postgres');
export const mailFolder = join(localFolder, 'mail');

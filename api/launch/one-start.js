import { mkdirSync, readFileSync, readlinkSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { localFolder, projectFolder } from './local-folder.js';

const file = join(localFolder, 'running');

/** Process that runs the product on this local folder now; null when there is none. */
export function runningStart() {
  try {
    const pid = Number(readFileSync(file, 'utf8'));
    // The number may belong to somebody else by now.
    const words = readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0');
    const isOurs = words.some((word) => /api\/launch\/(start|dev)\.js$/.test(word));
    return isOurs && readlinkSync(`/proc/${pid}/cwd`) === projectFolder ? pid : null;
  } catch {
    return null;
  }
}

/**
 * Marks the local folder as used by this process until it ends.
 * @throws Error naming the process that uses it already
 */
export function claimStart() {
  const other = runningStart();
  if (other !== null && other !== process.pid) {
    throw new Error(`Dropwatt runs from this folder already (process ${other}); "make stop" ends it.`);
  }
  mkdirSync(localFolder, { recursive: true });
  writeFileSync(file, String(process.pid));
  process.once('exit', () => rmSync(file, { force: true }));
}

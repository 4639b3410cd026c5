import { createHash } from 'node:crypto';
import { mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { projectFolder, stampFolder } from './local-folder.js';

/** Hash of the contents of files and folders of the project. */
function contentHash(paths) {
  const hash = createHash('sha256');
  const add = (path) => {
    if (statSync(path).isDirectory()) {
      for (const name of readdirSync(path).sort()) if (name !== 'node_modules') add(join(path, name));
    } else {
      hash.update(path.slice(projectFolder.length)).update(readFileSync(path));
    }
  };
  for (const path of paths) add(join(projectFolder, path));
  return hash.digest('hex');
}

/**
 * Does something only when the files it depends on have changed since it was last done.
 * @param {string} name of the stamp
 * @param {string[]} paths files and folders it depends on
 * @param {() => boolean} isThere whether its product is still there
 * @param {() => Promise<void> | void} act
 */
export async function whenChanged(name, paths, isThere, act) {
  const file = join(stampFolder, name);
  const hash = contentHash(paths);
  let before = '';
  try {
    before = readFileSync(file, 'utf8');
  } catch {
    // Never done yet.
  }
  if (before === hash && isThere()) return false;
  await act();
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, hash);
  return true;
}

import { spawnSync } from 'node:child_process';
import { aptInstall } from '../../db/cluster/binaries.js';

/** Debian's Python, for which its SciPy is built; another one may come first on PATH. */
export const pythonPath = '/usr/bin/python3';

const isPresent = () => spawnSync(pythonPath, ['-c', 'import scipy.sparse.linalg, scipy.io']).status === 0;

/**
 * SciPy, the independent solver that the product's is held against.
 * @throws Error with one line that says what to install
 */
export function ensureSciPy() {
  if (isPresent()) return;
  if (process.getuid?.() !== 0)
    throw new Error('SciPy is missing. Install it first: sudo apt-get install python3-scipy');
  process.stdout.write('Installing SciPy …\n');
  aptInstall(['python3-scipy']);
  if (!isPresent()) throw new Error('SciPy could not be installed: apt-get install python3-scipy');
}

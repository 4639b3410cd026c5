import { spawnSync } from 'node:child_process';
import { appendFileSync, existsSync, mkdirSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

const debianFolder = '/usr/lib/postgresql';

/**
 * Folder of PostgreSQL's programs: PG_BIN, Debian's newest, or the one on PATH; null when there is none.
 * @param {string} [version] the only major version that will do
 * @returns {string | null}
 */
export function findPostgres(version) {
  const candidates = [process.env.PG_BIN, ...debianFolders(), folderOnPath()].filter(Boolean);
  return candidates.find((folder) => version === undefined || versionOf(folder) === version) ?? null;
}

function debianFolders() {
  if (!existsSync(debianFolder)) return [];
  return readdirSync(debianFolder)
    .sort((a, b) => Number(b) - Number(a))
    .map((version) => join(debianFolder, version, 'bin'))
    .filter((folder) => existsSync(join(folder, 'postgres')) && existsSync(join(folder, 'initdb')));
}

function folderOnPath() {
  const found = spawnSync('sh', ['-c', 'command -v postgres'], { encoding: 'utf8' }).stdout.trim();
  return found.replace(/\/postgres$/, '');
}

/** `postgres (PostgreSQL) 15.14 (Debian …)` says 15. */
function versionOf(folder) {
  const said = spawnSync(join(folder, 'postgres'), ['--version'], { encoding: 'utf8' }).stdout ?? '';
  return /\) (\d+)/.exec(said)?.[1] ?? null;
}

/**
 * Finds PostgreSQL, installing Debian's package where it is missing and that is allowed.
 * @throws Error with one line that says what to install
 */
export function ensurePostgres() {
  const found = findPostgres();
  if (found) return found;
  if (process.getuid?.() !== 0)
    throw new Error('PostgreSQL is missing. Install it first: sudo apt-get install postgresql');
  process.stdout.write('Installing PostgreSQL …\n');
  aptInstall(['postgresql-common']);
  // Debian would start a cluster of its own on port 5432; this project brings its own.
  const settings = '/etc/postgresql-common/createcluster.conf';
  if (!existsSync(settings) || !/^create_main_cluster\s*=\s*false/m.test(readFileSync(settings, 'utf8'))) {
    mkdirSync('/etc/postgresql-common', { recursive: true });
    appendFileSync(settings, '\ncreate_main_cluster = false\n');
  }
  aptInstall(['postgresql']);
  const installed = findPostgres();
  if (!installed) throw new Error('PostgreSQL could not be installed: apt-get install postgresql');
  return installed;
}

let isListUpdated = false;

/** @throws Error when apt-get fails, with its last lines */
export function aptInstall(packages) {
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  const run = (words) =>
    // Waits where another installation holds dpkg's lock.
    spawnSync('apt-get', ['-q', '-o', 'DPkg::Lock::Timeout=120', ...words], {
      env,
      encoding: 'utf8',
      stdio: ['ignore', 'pipe', 'pipe'],
      maxBuffer: 2 ** 28,
    });
  if (!isListUpdated) {
    run(['update']);
    isListUpdated = true;
  }
  const result = run(['install', '-y', '--no-install-recommends', ...packages]);
  if (result.status !== 0) {
    throw new Error(
      `apt-get install ${packages.join(' ')} failed:\n${(result.stderr || '').split('\n').slice(-6).join('\n')}`,
    );
  }
}

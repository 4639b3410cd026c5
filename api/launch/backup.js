import { spawnSync } from 'node:child_process';
import { renameSync, rmSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { ensureDatabase, replaceDatabase } from '../../db/cluster/ensure-database.js';

/**
 * Writes a database to a file, which is there only once it is whole.
 * @returns {number} its size in bytes
 * @throws Error when pg_dump fails
 */
export function writeBackup({ url, bin, file }) {
  const part = `${file}.part`;
  const made = tool(bin, 'pg_dump', ['--format=custom', '--no-owner', '--no-privileges', `--file=${part}`], url);
  if (made !== null) {
    rmSync(part, { force: true });
    throw new Error(`Nothing was backed up: ${made}`);
  }
  renameSync(part, file);
  return statSync(file).size;
}

/**
 * Replaces a database by a backup. The file is read whole and restored into a database of its own first, so that one
 * that is cut short or damaged leaves the present database as it is.
 * @throws Error saying what is wrong with the file
 */
export async function restoreBackup({ url, bin, file }) {
  const name = decodeURIComponent(new URL(url).pathname.slice(1));
  const onServer = (database) => Object.assign(new URL(url), { pathname: `/${encodeURIComponent(database)}` }).href;
  const fresh = `${name}_restored_${process.pid}`;
  await ensureDatabase(onServer, fresh);
  const words = ['--no-owner', '--no-privileges', '--exit-on-error', '--single-transaction', '--dbname='];
  const failure =
    tool(bin, 'pg_restore', ['--file=/dev/null', file], url) ??
    tool(bin, 'pg_restore', [...words, file], onServer(fresh));
  if (failure !== null) {
    await replaceDatabase(onServer, fresh, null);
    throw new Error(`${file} cannot be restored; the database is as it was. ${failure}`);
  }
  await replaceDatabase(onServer, name, fresh);
}

/**
 * Runs pg_dump or pg_restore on a database, whose password is kept out of the list of processes.
 * @returns {string | null} what went wrong, in one line
 */
function tool(bin, program, words, url) {
  const { hostname, port, username, password, pathname } = new URL(url);
  const env = {
    ...process.env,
    PGHOST: hostname,
    PGPORT: port || '5432',
    PGUSER: decodeURIComponent(username),
    PGPASSWORD: decodeURIComponent(password),
    PGDATABASE: decodeURIComponent(pathname.slice(1)),
  };
  const result = spawnSync(
    join(bin, program),
    words.map((word) => (word === '--dbname=' ? `${word}${env.PGDATABASE}` : word)),
    {
      env,
      encoding: 'utf8',
      stdio: ['ignore', 'ignore', 'pipe'],
    },
  );
  return result.status === 0 ? null : (result.stderr ?? String(result.error)).trim().split('\n').slice(-1)[0];
}

import { spawnSync } from 'node:child_process';
import { existsSync, rmSync, statSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { createInterface } from 'node:readline/promises';
import { findPostgres } from '../../db/cluster/binaries.js';
import { removeCluster, startCluster, stopCluster } from '../../db/cluster/cluster.js';
import { clusterFolder, localFolder, projectFolder } from './local-folder.js';
import { localSettings } from './local-settings.js';
import { prepareBuild, preparePackages } from './prepare.js';
import { runTool } from './run-tool.js';

/** What the Makefile's targets do on the local database. */
const [target, argument] = process.argv.slice(2);
const acts = { seed, migrate, rollback, backup, restore, stop, clean };

async function withCluster(act) {
  await preparePackages();
  const cluster = await startCluster({ folder: clusterFolder });
  try {
    await act(cluster);
  } finally {
    if (!cluster.wasRunning) cluster.stop();
  }
}

async function seed() {
  await withCluster(async (cluster) => {
    const { prepareDatabase } = await import('./database.js');
    const databaseUrl = await prepareDatabase(cluster);
    await prepareBuild();
    const env = { ...process.env, ...localSettings({ databaseUrl, smtpPort: 25 }), DEMO_SEED: 'yes' };
    await runTool(process.execPath, ['--enable-source-maps', 'dist/api/seed-demo.js'], { env, show: true });
    process.stdout.write('The demo is loaded.\n');
  });
}

async function migrate() {
  await withCluster(async (cluster) => {
    const { prepareDatabase } = await import('./database.js');
    await prepareDatabase(cluster);
    process.stdout.write('The database is at the newest migration.\n');
  });
}

async function rollback() {
  await withCluster(async (cluster) => {
    const { withMigrations } = await import('./database.js');
    const [, names] = await withMigrations(cluster.url('dropwatt'), (migrator) => migrator.rollback());
    process.stdout.write(names.length ? `Taken back: ${names.join(', ')}\n` : 'There is no migration to take back.\n');
  });
}

/** pg_dump and pg_restore of the cluster's own version. */
function postgresTool(program, words, env) {
  const result = spawnSync(join(findPostgres(), program), words, { stdio: ['ignore', 'inherit', 'inherit'], env });
  if (result.status !== 0) throw new Error(`${program} failed; nothing was kept.`);
}

async function backup() {
  const file = named();
  await withCluster(async (cluster) => {
    postgresTool('pg_dump', ['--format=custom', '--no-owner', `--file=${file}`, cluster.url('dropwatt')], process.env);
    process.stdout.write(`${file}: ${statSync(file).size} bytes\n`);
  });
}

async function restore() {
  const file = named();
  if (!existsSync(file)) throw new Error(`BACKUP: ${file} does not exist.`);
  await withCluster(async (cluster) => {
    const { ensureDatabase, replaceDatabase } = await import('../../db/cluster/ensure-database.js');
    // Into a database of its own first: a file that is cut short must leave the present one as it is.
    const fresh = `restored_${Date.now()}`;
    await ensureDatabase(cluster.url, fresh);
    try {
      postgresTool(
        'pg_restore',
        ['--no-owner', '--exit-on-error', '--single-transaction', `--dbname=${cluster.url(fresh)}`, file],
        process.env,
      );
    } catch (error) {
      await replaceDatabase(cluster.url, fresh, null);
      throw error;
    }
    await replaceDatabase(cluster.url, 'dropwatt', fresh);
    process.stdout.write(`Restored from ${file}.\n`);
  });
}

function named() {
  if (!argument) throw new Error('BACKUP must name a file, such as BACKUP=dropwatt.dump.');
  return resolve(argument);
}

async function stop() {
  process.stdout.write(
    stopCluster(clusterFolder) ? 'The local database is stopped.\n' : 'The local database does not run.\n',
  );
}

async function clean() {
  if (existsSync(localFolder)) {
    if (argument !== '1' && !(await confirmed())) return void process.stdout.write('Nothing was removed.\n');
    stopCluster(clusterFolder);
    removeCluster(clusterFolder);
    rmSync(localFolder, { recursive: true, force: true });
  }
  for (const folder of ['dist', 'coverage']) rmSync(join(projectFolder, folder), { recursive: true, force: true });
  process.stdout.write('Removed: built files, local database.\n');
}

async function confirmed() {
  if (!process.stdin.isTTY)
    throw new Error('clean removes the local database; say YES=1 to do it without being asked.');
  const lines = createInterface({ input: process.stdin, output: process.stdout });
  const answer = await lines.question(
    'This removes the local database with all that it holds. Type "remove" to go on: ',
  );
  lines.close();
  return answer.trim() === 'remove';
}

try {
  await acts[target]();
} catch (error) {
  process.stderr.write(`${error.message}\n`);
  process.exitCode = 1;
}

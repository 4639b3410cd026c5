import { existsSync, rmSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { createInterface } from 'node:readline/promises';
import { setTimeout as pause } from 'node:timers/promises';
import { removeCluster, stopCluster } from '../../db/cluster/cluster.js';
import { seedDemo } from './demo.js';
import { clusterFolder, localFolder, projectFolder } from './local-folder.js';
import { localSettings } from './local-settings.js';
import { withDatabase } from './local-database.js';
import { runningStart } from './one-start.js';
import { prepareBuild, preparePackages } from './prepare.js';

/** What the Makefile's targets do on the local database, or on the one that DATABASE_URL names. */
const [target, argument] = process.argv.slice(2);
const acts = { seed, migrate, rollback, backup, restore, stop, clean };
const say = (line) => void process.stdout.write(`${line}\n`);

async function seed() {
  await preparePackages();
  await withDatabase(async ({ url }) => {
    const { migrateDatabase } = await import('./database.js');
    await migrateDatabase(url);
    await prepareBuild();
    await seedDemo(localSettings({ databaseUrl: url, smtpPort: 25 }));
  });
  say('The demo is loaded.');
}

async function migrate() {
  await preparePackages();
  await withDatabase(async ({ url }) => {
    const { migrateDatabase } = await import('./database.js');
    const names = await migrateDatabase(url);
    say(names.length ? `Done: ${names.join(', ')}` : 'The database is at the newest migration already.');
  });
}

async function rollback() {
  await preparePackages();
  await withDatabase(async ({ url }) => {
    const { rollBackDatabase } = await import('./database.js');
    const names = await rollBackDatabase(url);
    say(names.length ? `Taken back: ${names.join(', ')}` : 'There is no migration to take back.');
  });
}

async function backup() {
  const file = resolve(
    argument || join(projectFolder, `dropwatt-${new Date().toISOString().replace(/[:.]/g, '')}.dump`),
  );
  await preparePackages();
  const { writeBackup } = await import('./backup.js');
  await withDatabase(async ({ url, bin }) => say(`${file}: ${writeBackup({ url, bin, file })} bytes`));
}

async function restore() {
  if (!argument) throw new Error('BACKUP must name a file, such as BACKUP=dropwatt.dump.');
  const file = resolve(argument);
  if (!existsSync(file)) throw new Error(`BACKUP: ${file} does not exist.`);
  if (runningStart() !== null) throw new Error('Dropwatt runs; end it first with "make stop".');
  await preparePackages();
  const { restoreBackup } = await import('./backup.js');
  await withDatabase(({ url, bin }) => restoreBackup({ url, bin, file }));
  say(`Restored from ${file}.`);
}

async function stop() {
  const running = runningStart();
  if (running !== null) {
    process.kill(running, 'SIGTERM');
    while (runningStart() === running) await pause(100);
  }
  const wasLeft = stopCluster(clusterFolder);
  say(running !== null || wasLeft ? 'Stopped.' : 'Nothing runs here.');
}

async function clean() {
  if (existsSync(localFolder)) {
    if (argument !== '1' && !(await confirmed())) return say('Nothing was removed.');
    await stop();
    removeCluster(clusterFolder);
    rmSync(localFolder, { recursive: true, force: true });
  }
  for (const folder of ['dist', 'coverage']) rmSync(join(projectFolder, folder), { recursive: true, force: true });
  say('Removed: built files, local database, mail and session secret.');
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

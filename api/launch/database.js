import knexPkg from 'knex';
import knexfile from '../../knexfile.js';
import { projectFolder } from './local-folder.js';
import { ensureDatabase, withSessionLock } from '../../db/cluster/ensure-database.js';

/** A migrated database of a cluster, made where it is missing. @returns its URL */
export async function prepareDatabase(cluster, name) {
  await ensureDatabase(cluster.url, name);
  const url = cluster.url(name);
  await migrateDatabase(url);
  return url;
}

/** Brings a database to the newest state. @returns {Promise<string[]>} the migrations that ran */
export async function migrateDatabase(url) {
  const [, names] = await withMigrations(url, (migrator) => migrator.latest());
  return names;
}

/** Takes back the newest migration. @returns {Promise<string[]>} the one that was taken back */
export async function rollBackDatabase(url) {
  const [, names] = await withMigrations(url, (migrator) => migrator.down());
  return names;
}

/**
 * Runs something on the migrations of a database. A session lock lets one process migrate at a time; the mark that a
 * killed one has left behind in Knex's own lock table is therefore stale and is taken away.
 */
async function withMigrations(url, act) {
  const database = knexPkg({
    ...knexfile,
    connection: { connectionString: url, connectionTimeoutMillis: 5000 },
    migrations: { ...knexfile.migrations, directory: `${projectFolder}/db/migrations` },
  });
  try {
    return await withSessionLock(url, async () => {
      await database.migrate.forceFreeMigrationsLock();
      return act(database.migrate);
    });
  } finally {
    await database.destroy();
  }
}

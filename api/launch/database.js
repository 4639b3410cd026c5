import knexPkg from 'knex';
import knexfile from '../../knexfile.js';
import { projectFolder } from './local-folder.js';
import { ensureDatabase } from '../../db/cluster/ensure-database.js';

/** Database of the project on a cluster, migrated to the newest state. @returns its URL */
export async function prepareDatabase(cluster, name = 'dropwatt') {
  await ensureDatabase(cluster.url, name);
  const url = cluster.url(name);
  await withMigrations(url, (migrate) => migrate.latest());
  return url;
}

/** Runs something on the migrations of a database. @param {(migrate: import('knex').Knex.Migrator) => Promise<unknown>} act */
export async function withMigrations(url, act) {
  const knex = knexPkg({
    ...knexfile,
    connection: url,
    migrations: { ...knexfile.migrations, directory: `${projectFolder}/db/migrations` },
  });
  try {
    return await act(knex.migrate);
  } finally {
    await knex.destroy();
  }
}

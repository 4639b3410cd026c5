import { ensurePostgres } from '../../db/cluster/binaries.js';
import { startCluster } from '../../db/cluster/cluster.js';
import { clusterFolder } from './local-folder.js';

const localName = 'dropwatt';
const watchEveryMs = 1000;

/**
 * The database of a start: the one that DATABASE_URL names, or the project's own cluster, made and started where it is
 * missing, migrated to the newest state in both cases.
 * @returns {Promise<{ url: string, isOwn: boolean, stop: () => void }>} an own cluster that crashes is started again
 *   until it is stopped
 */
export async function openLocalDatabase() {
  const given = process.env.DATABASE_URL;
  if (given) {
    const { migrateDatabase } = await import('./database.js');
    await migrateDatabase(given);
    return { url: given, isOwn: false, stop: () => {} };
  }
  const cluster = await startCluster({ folder: clusterFolder });
  const watch = setInterval(() => {
    if (!cluster.hasCrashed()) return;
    process.stderr.write('PostgreSQL ended unasked; it is started again.\n');
    try {
      cluster.restart();
    } catch (error) {
      process.stderr.write(`${error.message}\n`);
    }
  }, watchEveryMs);
  const stop = () => {
    clearInterval(watch);
    cluster.stop();
  };
  try {
    // Imported late: this needs packages.
    const { prepareDatabase } = await import('./database.js');
    return { url: await prepareDatabase(cluster, localName), isOwn: true, stop };
  } catch (error) {
    stop();
    throw error;
  }
}

/**
 * Does something on the database that DATABASE_URL names, or on the local one, whose cluster is started for it where
 * it does not run.
 * @param {(database: { url: string, bin: string }) => unknown} act `bin`: folder of PostgreSQL's programs
 */
export async function withDatabase(act) {
  if (process.env.DATABASE_URL) return act({ url: process.env.DATABASE_URL, bin: ensurePostgres() });
  const cluster = await startCluster({ folder: clusterFolder });
  try {
    const { ensureDatabase } = await import('../../db/cluster/ensure-database.js');
    await ensureDatabase(cluster.url, localName);
    await act({ url: cluster.url(localName), bin: cluster.bin });
  } finally {
    if (!cluster.wasRunning) cluster.stop();
  }
}

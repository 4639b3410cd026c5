import pg from 'pg';

async function withClient(url, act) {
  const client = new pg.Client({ connectionString: url('postgres') });
  await client.connect();
  try {
    return await act(client);
  } finally {
    await client.end();
  }
}

/** Makes a database when it is not there. @param {(database: string) => string} url of a database of the cluster */
export function ensureDatabase(url, name) {
  return withClient(url, async (client) => {
    const found = await client.query('select 1 from pg_database where datname = $1', [name]);
    if (found.rowCount === 0) await client.query(`create database ${pg.escapeIdentifier(name)}`);
  });
}

/** Drops a database and gives its name to another one; with `by` null it is only dropped. */
export function replaceDatabase(url, name, by) {
  return withClient(url, async (client) => {
    await client.query(`drop database if exists ${pg.escapeIdentifier(name)} with (force)`);
    if (by !== null)
      await client.query(`alter database ${pg.escapeIdentifier(by)} rename to ${pg.escapeIdentifier(name)}`);
  });
}

/** Number of the lock under which migrations run; any constant that nothing else in the database uses. */
const migrationLock = 4_680_001;

/** Runs something while no other process does so on the same database; it waits for its turn. */
export async function withSessionLock(url, act) {
  const client = new pg.Client({ connectionString: url, connectionTimeoutMillis: 5000 });
  await client.connect();
  try {
    await client.query('select pg_advisory_lock($1)', [migrationLock]);
    return await act();
  } finally {
    await client.end();
  }
}

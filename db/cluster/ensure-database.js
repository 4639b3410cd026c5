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

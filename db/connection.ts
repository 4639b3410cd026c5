import knexPkg, { type Knex } from 'knex';
import pg from 'pg';

const bigint = 20;
const numeric = 1700;
const date = 1082;

// Text by default: counts and decimals are numbers here, and a date must not shift with the time zone.
pg.types.setTypeParser(bigint, Number);
pg.types.setTypeParser(numeric, Number);
pg.types.setTypeParser(date, (value) => value);

// Knex prints every failed connection by itself; the caller gets the same fault and tells it once.
const quiet = { warn: () => {}, error: () => {}, debug: () => {}, deprecate: () => {} };

/**
 * Pool of connections to the database.
 * @param most connections at a time; a caller waits at most 3 s for one
 */
export function openDatabase(url: string, most = 10): Knex {
  return knexPkg({
    client: 'pg',
    connection: { connectionString: url, application_name: 'dropwatt', connectionTimeoutMillis: 3000 },
    pool: { min: 0, max: most },
    acquireConnectionTimeout: 3000,
    log: quiet,
  });
}

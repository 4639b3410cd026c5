import type { Knex } from 'knex';

/** A connection pool or an open transaction; table modules take either. */
export type Database = Knex;

/** First row of a statement that must give one. */
export function only<T>(rows: readonly T[]): T {
  const [row] = rows;
  if (row === undefined) throw new Error('a statement that must give one row gave none');
  return row;
}

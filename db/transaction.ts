import type { Knex } from 'knex';
import type { Database } from './database.ts';

/** Deadlock and serialisation failure: nothing was changed, so the whole piece of work may run again. */
const repeatable = new Set(['40P01', '40001']);

/** Runs `work` in one transaction; up to three times where PostgreSQL had to break a tie. Nested calls make a savepoint. */
export async function transaction<T>(database: Database, work: (trx: Knex.Transaction) => Promise<T>): Promise<T> {
  for (let tries = 1; ; tries++) {
    try {
      return await database.transaction(work);
    } catch (error) {
      const nested = 'isCompleted' in database;
      if (nested || tries === 3 || !repeatable.has(sqlState(error) ?? '')) throw error;
    }
  }
}

/** SQLSTATE of a database error; null for anything else. */
export function sqlState(error: unknown): string | null {
  if (typeof error !== 'object' || error === null || !('code' in error)) return null;
  return typeof error.code === 'string' && /^[0-9A-Z]{5}$/.test(error.code) ? error.code : null;
}

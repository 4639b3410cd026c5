import { randomBytes } from 'node:crypto';
import type { Knex } from 'knex';
import pg from 'pg';
import { afterAll, beforeAll, inject } from 'vitest';
import { openDatabase } from '#db/connection.ts';

const templateName = 'migrated_template';

/** A database of its own for a test file; its fields are there once the file's hooks have run. */
export type TestDatabase = { knex: Knex; url: string };

/** Clones the migrated template before the file's tests and drops the clone behind them. */
export function testDatabase(): TestDatabase {
  const name = `test_${randomBytes(8).toString('hex')}`;
  const pattern = inject('databaseUrlPattern');
  const database = {} as TestDatabase;
  const asAdministrator = async (statement: string) => {
    const client = new pg.Client({ connectionString: pattern.replace('NAME', 'postgres') });
    await client.connect();
    try {
      await client.query(statement);
    } finally {
      await client.end();
    }
  };
  beforeAll(async () => {
    await asAdministrator(`create database ${name} template ${templateName} strategy file_copy`);
    database.url = pattern.replace('NAME', name);
    database.knex = openDatabase(database.url);
  });
  afterAll(async () => {
    await database.knex.destroy();
    await asAdministrator(`drop database ${name} with (force)`);
  });
  return database;
}

import { expect, test } from 'vitest';
import { migrateDatabase, rollBackDatabase } from '#api/launch/database.js';
import { testDatabase } from '../support/database.ts';

const database = testDatabase();

const tables = async () => {
  const rows = await database
    .knex('pg_tables')
    .where({ schemaname: 'public' })
    .orderBy('tablename')
    .select<{ tablename: string }[]>('tablename');
  return rows.map(({ tablename }) => tablename).filter((name) => !name.startsWith('knex_'));
};

test('migrations – down and up again – leave nothing and bring everything back', async () => {
  const before = await tables();
  expect(before.length).toBeGreaterThan(10);
  for (let left = true; left;) left = (await rollBackDatabase(database.url)).length > 0;
  expect(await tables()).toEqual([]);
  await migrateDatabase(database.url);
  expect(await tables()).toEqual(before);
});

test('every table – has a primary key; every foreign key – an index that begins with it', async () => {
  const bare = await database.knex.raw(`
    select c.relname from pg_class c join pg_namespace n on n.oid = c.relnamespace
    where n.nspname = 'public' and c.relkind = 'r'
      and not exists (select 1 from pg_constraint k where k.conrelid = c.oid and k.contype = 'p')
      and c.relname not like 'knex_%'`);
  expect(bare.rows).toEqual([]);
  const unindexed = await database.knex.raw(`
    select conrelid::regclass::text as table, conname from pg_constraint k
    where contype = 'f' and connamespace = 'public'::regnamespace
      and not exists (
        select 1 from pg_index i
        where i.indrelid = k.conrelid and i.indpred is null
          and (i.indkey::int2[])[0:cardinality(k.conkey) - 1] operator(pg_catalog.@>) k.conkey)`);
  expect(unindexed.rows).toEqual([]);
});

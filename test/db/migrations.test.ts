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

/** Everything that a schema consists of, as text: columns, constraints, indexes, triggers and functions. */
const schema = async () => {
  const { rows } = await database.knex.raw<{ rows: { line: string }[] }>(`
    select format('%s.%s %s %s %s', table_name, column_name, udt_name, is_nullable, column_default) as line
      from information_schema.columns where table_schema = 'public' and table_name not like 'knex_%'
    union all select conrelid::regclass || ' ' || conname || ' ' || pg_get_constraintdef(oid)
      from pg_constraint where connamespace = 'public'::regnamespace and conrelid::regclass::text not like 'knex_%'
    union all select indexdef from pg_indexes where schemaname = 'public' and tablename not like 'knex_%'
    union all select pg_get_triggerdef(oid) from pg_trigger where not tgisinternal
    union all select pg_get_functiondef(oid) from pg_proc where pronamespace = 'public'::regnamespace
    order by line`);
  return rows.map(({ line }) => line);
};

test('migrations – down and up again – leave nothing and bring everything back', async () => {
  const before = await tables();
  const whole = await schema();
  expect(before.length).toBeGreaterThan(10);
  for (let left = true; left;) left = (await rollBackDatabase(database.url)).length > 0;
  expect(await tables()).toEqual([]);
  expect(await schema()).toEqual([]);
  await migrateDatabase(database.url);
  expect(await tables()).toEqual(before);
  expect(await schema()).toEqual(whole);
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

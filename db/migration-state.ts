import { readdir } from 'node:fs/promises';
import type { Database } from './database.ts';

/** True when exactly the migrations in the folder have run on the database. */
export async function migrationsComplete(database: Database, folder: string): Promise<boolean> {
  const files = (await readdir(folder)).filter((file) => file.endsWith('.js')).sort();
  const rows = await database('knex_migrations').orderBy('name').select<{ name: string }[]>('name');
  return files.length === rows.length && files.every((file, index) => file === rows[index]?.name);
}

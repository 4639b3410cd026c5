import type { Database } from './database.ts';

export type LibraryItem = { kind: 'package' | 'part'; key: string; document: object };

/** Adds to a team's library or replaces what had the same key. */
export async function putLibraryItem(database: Database, teamId: string, item: LibraryItem): Promise<void> {
  await database('library_items')
    .insert({ team_id: teamId, kind: item.kind, key: item.key, document: JSON.stringify(item.document) })
    .onConflict(['team_id', 'kind', 'key'])
    .merge(['document']);
}

export async function listLibraryItems(database: Database, teamId: string): Promise<LibraryItem[]> {
  return database('library_items')
    .where({ team_id: teamId })
    .orderBy(['kind', 'key'])
    .select<LibraryItem[]>('kind', 'key', 'document');
}

import type { BoardDocument } from '#core/board/document.ts';
import { type Database, only } from './database.ts';

export type SketchVersion = { version: number; savedAt: Date; savedBy: string; savedById: string; boardHash: string };

type Row = { version: number; saved_at: Date; saved_by: string; name: string; board_hash: string };

const version = (row: Row): SketchVersion => ({
  version: row.version,
  savedAt: row.saved_at,
  savedBy: row.name,
  savedById: row.saved_by,
  boardHash: row.board_hash,
});

/** Keeps a board as it was written, without the defaults that reading fills in. */
export async function insertSketchVersion(
  database: Database,
  given: { revisionId: string; version: number; board: BoardDocument; boardHash: string; savedBy: string },
): Promise<Date> {
  const rows = await database('sketch_versions')
    .insert({
      revision_id: given.revisionId,
      version: given.version,
      board: JSON.stringify(given.board),
      board_hash: given.boardHash,
      saved_by: given.savedBy,
    })
    .returning<{ saved_at: Date }[]>('saved_at');
  return only(rows).saved_at;
}

/** Newest first. */
export async function listSketchVersions(database: Database, revisionId: string): Promise<SketchVersion[]> {
  const rows: Row[] = await selected(database).where({ revision_id: revisionId }).orderBy('version', 'desc');
  return rows.map(version);
}

/** Newest two saves: the present sketch and the one before it. */
export async function lastSketchVersions(database: Database, revisionId: string): Promise<SketchVersion[]> {
  const rows: Row[] = await selected(database).where({ revision_id: revisionId }).orderBy('version', 'desc').limit(2);
  return rows.map(version);
}

export async function findSketchVersion(
  database: Database,
  revisionId: string,
  number: number,
): Promise<(SketchVersion & { board: BoardDocument }) | null> {
  const row: (Row & { board: BoardDocument }) | undefined = await selected(database)
    .select('board')
    .where({ revision_id: revisionId, version: number })
    .first();
  return row ? { ...version(row), board: row.board } : null;
}

function selected(database: Database) {
  return database('sketch_versions as s')
    .join('members as m', 'm.id', 's.saved_by')
    .select('s.version', 's.saved_at', 's.saved_by', 'm.name', 's.board_hash');
}

export async function countConditions(database: Database, revisionId: string, number: number): Promise<number> {
  const rows = await database('sketch_versions')
    .where({ revision_id: revisionId, version: number })
    .select<{ count: number }[]>(database.raw("jsonb_array_length(board->'conditions') as count"));
  return only(rows).count;
}

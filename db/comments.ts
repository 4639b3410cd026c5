import { type Database, only } from './database.ts';

export type Comment = {
  id: string;
  author: string;
  text: string;
  place: { kind: string; id: string } | null;
  createdAt: Date;
  resolvedAt: Date | null;
  resolvedBy: string | null;
};

type Row = {
  id: string;
  author: string;
  text: string;
  place_kind: string | null;
  place_id: string | null;
  created_at: Date;
  resolved_at: Date | null;
  resolver: string | null;
};

const comment = (row: Row): Comment => ({
  id: row.id,
  author: row.author,
  text: row.text,
  place: row.place_kind !== null && row.place_id !== null ? { kind: row.place_kind, id: row.place_id } : null,
  createdAt: row.created_at,
  resolvedAt: row.resolved_at,
  resolvedBy: row.resolver,
});

export async function insertComment(
  database: Database,
  given: {
    id: string;
    revisionId: string;
    authorId: string;
    text: string;
    place: { kind: string; id: string } | null;
  },
): Promise<void> {
  await database('comments').insert({
    id: given.id,
    revision_id: given.revisionId,
    author_id: given.authorId,
    text: given.text,
    place_kind: given.place?.kind ?? null,
    place_id: given.place?.id ?? null,
  });
}

/** Oldest first. */
export async function listComments(database: Database, revisionId: string): Promise<Comment[]> {
  const rows: Row[] = await selected(database).where('c.revision_id', revisionId).orderBy(['c.created_at', 'c.id']);
  return rows.map(comment);
}

export async function findComment(database: Database, revisionId: string, id: string): Promise<Comment | null> {
  const row: Row | undefined = await selected(database).where({ 'c.revision_id': revisionId, 'c.id': id }).first();
  return row ? comment(row) : null;
}

/** False when it was resolved already. */
export async function resolveComment(database: Database, id: string, memberId: string): Promise<boolean> {
  const count = await database('comments')
    .where({ id })
    .whereNull('resolved_at')
    .update({ resolved_at: database.fn.now(), resolved_by: memberId });
  return count === 1;
}

export async function countOpenComments(database: Database, revisionId: string): Promise<number> {
  const rows = await database('comments')
    .where({ revision_id: revisionId })
    .whereNull('resolved_at')
    .select<{ open: number }[]>(database.raw('count(*)::int as open'));
  return only(rows).open;
}

function selected(database: Database) {
  return database('comments as c')
    .join('members as a', 'a.id', 'c.author_id')
    .leftJoin('members as r', 'r.id', 'c.resolved_by')
    .select('c.id', 'a.name as author', 'c.text', 'c.place_kind', 'c.place_id', 'c.created_at', 'c.resolved_at')
    .select('r.name as resolver');
}

import type { Database } from './database.ts';

export type SignatureMeaning = 'authored' | 'reviewed' | 'released';
export type Signature = { name: string; meaning: SignatureMeaning; signedAt: Date };

type Row = { name: string; meaning: SignatureMeaning; signed_at: Date };

export async function insertSignature(
  database: Database,
  given: {
    id: string;
    revisionId: string;
    memberId: string;
    name: string;
    meaning: SignatureMeaning;
    sketchVersion: number;
  },
): Promise<void> {
  await database('signatures').insert({
    id: given.id,
    revision_id: given.revisionId,
    member_id: given.memberId,
    name: given.name,
    meaning: given.meaning,
    sketch_version: given.sketchVersion,
  });
}

/** Signatures under one sketch version, in the order of signing; the newest of each meaning counts. */
export async function listSignatures(
  database: Database,
  revisionId: string,
  sketchVersion: number,
): Promise<Signature[]> {
  const rows = await database('signatures')
    .where({ revision_id: revisionId, sketch_version: sketchVersion })
    .orderBy(['signed_at', 'id'])
    .select<Row[]>('name', 'meaning', 'signed_at');
  const newest = new Map(rows.map((row) => [row.meaning, row]));
  return rows
    .filter((row) => newest.get(row.meaning) === row)
    .map((row) => ({ name: row.name, meaning: row.meaning, signedAt: row.signed_at }));
}

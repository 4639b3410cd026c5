import type { RecordedRevision } from '#core/record/record-input.ts';
import { authorsOf } from '#db/authors.ts';
import { listComments } from '#db/comments.ts';
import type { Database } from '#db/database.ts';
import { listReasons } from '#db/finding-reasons.ts';
import type { Revision } from '#db/revisions.ts';
import { listSignatures } from '#db/signatures.ts';

/** What a record says of people and papers; names are those of now, so an issued revision keeps its own copy. */
export type RecordFacts = Omit<RecordedRevision, 'letter' | 'state' | 'changedAt' | 'stateReason'>;

export async function recordFacts(database: Database, revision: Revision): Promise<RecordFacts> {
  const signatures = await listSignatures(database, revision.id, revision.sketchVersion);
  const comments = await listComments(database, revision.id);
  return {
    assemblyNumber: revision.assembly.number,
    assemblyTitle: revision.assembly.title,
    authors: (await authorsOf(database, revision.id)).map(({ name }) => name),
    reasons: await listReasons(database, revision.id),
    signatures: signatures.map((signature) => ({ ...signature, signedAt: signature.signedAt.toISOString() })),
    comments: comments.map(({ author, text, createdAt, resolvedBy }) => ({
      author,
      text,
      createdAt: createdAt.toISOString(),
      resolvedBy,
    })),
  };
}

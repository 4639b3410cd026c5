import { buildRecord } from '#core/record/build-record.ts';
import { listComments } from '#db/comments.ts';
import type { Database } from '#db/database.ts';
import { authorsOf } from '#db/authors.ts';
import { listReasons } from '#db/finding-reasons.ts';
import { listHeatFields } from '#db/heat-fields.ts';
import type { Revision } from '#db/revisions.ts';
import { listSignatures } from '#db/signatures.ts';
import { findSketchVersion } from '#db/sketch-versions.ts';
import { Refusal } from '../http/refusal.ts';
import { readWrittenBoard } from '../sketch/read-written-board.ts';
import { unpackHeatField } from '../solving/heat-field-pack.ts';
import { resultThatCounts } from '../solving/result-that-counts.ts';
import { renderRecord } from './render-record.ts';
import type { Paper } from './sheet.ts';

/** The derating record of a revision. @throws Refusal 409 when the present sketch has no result */
export async function printRecord(
  database: Database,
  revision: Revision,
  paper: Paper,
): Promise<{ pdf: Buffer; fileName: string }> {
  const stored = await resultThatCounts(database, revision);
  if (!stored?.upToDate) {
    throw new Refusal(
      409,
      'result-missing',
      'No result yet',
      'There is no result for this sketch yet. Run the check first.',
    );
  }
  const sketch = await findSketchVersion(database, revision.id, revision.sketchVersion);
  if (!sketch) throw new Error(`revision ${revision.id} has no sketch`);
  const packed = await listHeatFields(database, stored.id);
  const signatures = await listSignatures(database, revision.id, revision.sketchVersion);
  const comments = await listComments(database, revision.id);
  const record = buildRecord({
    board: readWrittenBoard(sketch.board).board,
    result: stored.result,
    fields: new Map([...packed].map(([condition, field]) => [condition, unpackHeatField(field)])),
    revision: {
      assemblyNumber: revision.assembly.number,
      assemblyTitle: revision.assembly.title,
      letter: revision.letter,
      state: revision.state,
      changedAt: revision.changedAt.toISOString(),
      authors: (await authorsOf(database, revision.id)).map(({ name }) => name),
      stateReason: revision.stateReason,
      reasons: await listReasons(database, revision.id),
      signatures: signatures.map((signature) => ({ ...signature, signedAt: signature.signedAt.toISOString() })),
      comments: comments.map(({ author, text, createdAt, resolvedBy }) => ({
        author,
        text,
        createdAt: createdAt.toISOString(),
        resolvedBy,
      })),
    },
  });
  const name = `${revision.assembly.number}-${revision.letter}-derating-record`.replace(/[^\w.-]+/g, '-');
  return { pdf: await renderRecord(record, paper), fileName: `${name}.pdf` };
}

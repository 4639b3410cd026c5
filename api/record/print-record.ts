import { buildRecord } from '#core/record/build-record.ts';
import type { Database } from '#db/database.ts';
import { listHeatFields } from '#db/heat-fields.ts';
import type { Revision } from '#db/revisions.ts';
import { findSketchVersion } from '#db/sketch-versions.ts';
import { Refusal } from '../http/refusal.ts';
import { readWrittenBoard } from '../sketch/read-written-board.ts';
import { unpackHeatField } from '../solving/heat-field-pack.ts';
import { resultThatCounts } from '../solving/result-that-counts.ts';
import { type RecordFacts, recordFacts } from './record-facts.ts';
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
  const facts = (revision.issuedFacts as RecordFacts | null) ?? (await recordFacts(database, revision));
  const record = buildRecord({
    board: readWrittenBoard(sketch.board).board,
    result: stored.result,
    fields: new Map([...packed].map(([condition, field]) => [condition, unpackHeatField(field)])),
    revision: {
      ...facts,
      letter: revision.letter,
      state: revision.state,
      changedAt: revision.changedAt.toISOString(),
      stateReason: revision.stateReason,
    },
  });
  const name = `${facts.assemblyNumber}-${revision.letter}-derating-record`.replace(/[^\w.-]+/g, '-');
  return { pdf: await renderRecord(record, paper), fileName: `${name}.pdf` };
}

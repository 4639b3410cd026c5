import type { Knex } from 'knex';
import { checkBoard } from '#core/check/check-board.ts';
import { insertHeatFields } from '#db/heat-fields.ts';
import { insertResult } from '#db/results.ts';
import { findRevision } from '#db/revisions.ts';
import { createAssembly } from '../assemblies/create-assembly.ts';
import { startRevision } from '../assemblies/start-revision.ts';
import type { Deps } from '../deps.ts';
import { clearRevision } from '../review/clear-revision.ts';
import { issueRevision } from '../review/issue-revision.ts';
import { submitRevision } from '../review/submit-revision.ts';
import { readWrittenBoard } from '../sketch/read-written-board.ts';
import { packHeatField } from '../solving/heat-field-pack.ts';
import type { Demo } from './demo-files.ts';
import type { DemoActor, DemoPeople } from './seed-team.ts';

type SeedDeps = Pick<Deps, 'newId' | 'publicUrl'>;

/** PCA-0617 with A over its limits and B in review; PCA-0702 issued. */
export async function seedAssemblies(
  deps: SeedDeps,
  trx: Knex.Transaction,
  people: DemoPeople,
  demo: Demo,
): Promise<void> {
  const designer = people('layout-designer');
  const main = await createAssembly(deps, trx, designer, {
    number: 'PCA-0617',
    title: 'Tidewrack TW-6 main board',
    board: demo.boards.a,
  });
  await storeCheck(deps, trx, designer, demo.boards.a);
  const second = await startRevision(deps, trx, designer, {
    assembly: { id: main.assemblyId, number: 'PCA-0617' },
    letter: 'B',
    ordinal: 2,
    written: readWrittenBoard(demo.boards.b),
    from: 'A',
  });
  await storeCheck(deps, trx, designer, demo.boards.b);
  await submitRevision(deps, trx, designer, { revisionId: second, overVersion: 1, reasons: [] });

  const small = await createAssembly(deps, trx, designer, {
    number: 'PCA-0702',
    title: 'Tidewrack sensor head supply',
    board: demo.boards.small,
  });
  await storeCheck(deps, trx, designer, demo.boards.small);
  const { revisionId } = small;
  const over = async () => ({
    revisionId,
    overVersion: (await findRevision(trx, designer.team.id, revisionId))!.version,
  });
  await submitRevision(deps, trx, designer, { ...(await over()), reasons: [] });
  await clearRevision(deps, trx, people('thermal-reviewer'), await over());
  await issueRevision(deps, trx, people('quality-engineer'), await over());
}

/** The result that a worker would store for this sketch. */
async function storeCheck(
  deps: SeedDeps,
  trx: Knex.Transaction,
  { team }: DemoActor,
  document: unknown,
): Promise<void> {
  const { board, assumptions } = readWrittenBoard(document);
  const { result, fields } = checkBoard(board, assumptions, { now: () => performance.now() });
  const { inputHash, method, verdict } = result;
  const id = await insertResult(trx, { id: deps.newId(), teamId: team.id, inputHash, method, verdict, result });
  if (id) await insertHeatFields(trx, id, new Map([...fields].map(([name, field]) => [name, packHeatField(field)])));
}

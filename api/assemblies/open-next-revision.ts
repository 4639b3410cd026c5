import { nextLetter } from '#core/review/next-letter.ts';
import { refusal } from '#core/review/permissions.ts';
import { lockAssembly } from '#db/assemblies.ts';
import type { Database } from '#db/database.ts';
import { revisionsOf } from '#db/revisions.ts';
import { findSketchVersion } from '#db/sketch-versions.ts';
import type { Deps } from '../deps.ts';
import { invalid, notFound } from '../http/refusal.ts';
import { refuseAct } from '../review/refuse-act.ts';
import type { Actor } from '../session/actor.ts';
import { readWrittenBoard } from '../sketch/read-written-board.ts';
import { startRevision } from './start-revision.ts';

/** Opens the revision with the next free letter; its first sketch is the last one of `from`. */
export async function openNextRevision(
  deps: Pick<Deps, 'newId'>,
  database: Database,
  actor: Pick<Actor, 'member' | 'team'>,
  given: { assemblyId: string; from: string },
): Promise<string> {
  const assembly = await lockAssembly(database, actor.team.id, given.assemblyId);
  if (!assembly) throw notFound('This assembly');
  const revisions = await revisionsOf(database, actor.team.id, assembly.id);
  const [newest] = revisions;
  const from = revisions.find(({ id }) => id === given.from);
  if (!newest || !from) throw invalid([{ path: 'from', message: 'must be a revision of this assembly' }]);
  const refused = refusal('open-next', actor.member.roles, from.state, false);
  if (refused) throw refuseAct(refused, from);
  const sketch = await findSketchVersion(database, from.id, from.sketchVersion);
  if (!sketch) throw new Error(`revision ${from.id} has no sketch`);
  return startRevision(deps, database, actor, {
    assembly,
    letter: nextLetter(newest.letter),
    ordinal: newest.ordinal + 1,
    written: readWrittenBoard(sketch.board),
    from: from.letter,
  });
}

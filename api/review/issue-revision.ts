import { clearGuards, type GuardFailure } from '#core/review/guards.ts';
import { lockAssembly } from '#db/assemblies.ts';
import { countOpenComments } from '#db/comments.ts';
import type { Database } from '#db/database.ts';
import { membersWithRole } from '#db/members.ts';
import { type Revision, revisionsOf } from '#db/revisions.ts';
import { insertSignature } from '#db/signatures.ts';
import type { Deps } from '../deps.ts';
import { technicalRoles } from '#core/review/permissions.ts';
import { issuedNotice } from '../mail/notices/issued-notice.ts';
import type { Actor } from '../session/actor.ts';
import { recordFacts } from '../record/record-facts.ts';
import { resultThatCounts } from '../solving/result-that-counts.ts';
import { actOnRevision } from './act-on-revision.ts';
import { changeState } from './change-state.ts';
import { notify } from './notify.ts';
import { refuseGuarded } from './refuse-guarded.ts';
import { refuseStale } from './refuse-stale.ts';

/** Issues a cleared revision: signs the release, freezes it, and supersedes the one issued before. */
export async function issueRevision(
  deps: Pick<Deps, 'newId' | 'publicUrl'>,
  database: Database,
  actor: Pick<Actor, 'member' | 'team'>,
  given: { revisionId: string; overVersion: number },
): Promise<void> {
  await actOnRevision(database, actor, given.revisionId, 'issue', async (trx, revision) => {
    await refuseStale(trx, revision, given.overVersion);
    await lockAssembly(trx, actor.team.id, revision.assembly.id);
    const siblings = await revisionsOf(trx, actor.team.id, revision.assembly.id);
    const stored = await resultThatCounts(trx, revision);
    const openComments = await countOpenComments(trx, revision.id);
    refuseGuarded([
      ...clearGuards({ result: stored?.upToDate ? stored.result : null, reasons: [], openComments }),
      ...laterIssued(revision, siblings),
    ]);
    // Signed before the state changes: the database takes no signature under an issued revision.
    await insertSignature(trx, {
      id: deps.newId(),
      revisionId: revision.id,
      memberId: actor.member.id,
      name: actor.member.name,
      meaning: 'released',
      sketchVersion: revision.sketchVersion,
    });
    const superseded = siblings.filter(({ id, state }) => id !== revision.id && state === 'issued');
    await changeState(trx, actor, revision, 'issue', {
      issuedFacts: await recordFacts(trx, revision),
      facts: { supersedes: superseded.map(({ letter }) => letter), verdict: stored?.result.verdict },
    });
    for (const earlier of superseded)
      await changeState(trx, actor, earlier, 'supersede', { facts: { by: revision.letter } });
    const members = await membersWithRole(trx, actor.team.id, technicalRoles);
    await notify(deps, trx, actor, revision, members, stored?.result ?? null, issuedNotice);
  });
}

function laterIssued(revision: Revision, siblings: readonly Revision[]): GuardFailure[] {
  const later = siblings.find(({ state, ordinal }) => state === 'issued' && ordinal > revision.ordinal);
  if (!later) return [];
  return [{ code: 'later-issued', message: `Revision ${later.letter} is issued already and is the later one.` }];
}

import { clearGuards } from '#core/review/guards.ts';
import { authorsOf } from '#db/authors.ts';
import { countOpenComments } from '#db/comments.ts';
import type { Database } from '#db/database.ts';
import { membersWithRole, presentMembers } from '#db/members.ts';
import { findResult } from '#db/results.ts';
import { insertSignature } from '#db/signatures.ts';
import type { Deps } from '../deps.ts';
import { clearedNotice } from '../mail/notices/cleared-notice.ts';
import type { Actor } from '../session/actor.ts';
import { methodVersion as method } from '#core/thermal/method.ts';
import { actOnRevision } from './act-on-revision.ts';
import { changeState } from './change-state.ts';
import { notify } from './notify.ts';
import { refuseGuarded } from './refuse-guarded.ts';
import { refuseStale } from './refuse-stale.ts';

/** Clears a revision after review, signs it as reviewed and ties it to the result that the reviewer saw. */
export async function clearRevision(
  deps: Pick<Deps, 'newId' | 'publicUrl'>,
  database: Database,
  actor: Pick<Actor, 'member' | 'team'>,
  given: { revisionId: string; overVersion: number },
): Promise<void> {
  await actOnRevision(database, actor, given.revisionId, 'clear', async (trx, revision) => {
    await refuseStale(trx, revision, given.overVersion);
    const stored = await findResult(trx, actor.team.id, revision.sketchHash, method);
    const openComments = await countOpenComments(trx, revision.id);
    refuseGuarded(clearGuards({ result: stored?.result ?? null, reasons: [], openComments }));
    if (!stored) throw new Error('the guards let a revision without result pass');
    await insertSignature(trx, {
      id: deps.newId(),
      revisionId: revision.id,
      memberId: actor.member.id,
      name: actor.member.name,
      meaning: 'reviewed',
      sketchVersion: revision.sketchVersion,
    });
    await changeState(trx, actor, revision, 'clear', {
      reason: null,
      resultId: stored.id,
      facts: { verdict: stored.result.verdict, method: stored.method },
    });
    const quality = await membersWithRole(trx, actor.team.id, ['quality-engineer']);
    const authors = await presentMembers(trx, actor.team.id, await authorsOf(trx, revision.id));
    await notify(deps, trx, actor, revision, [...quality, ...authors], stored.result, clearedNotice);
  });
}

import { authorsOf } from '#db/authors.ts';
import type { Database } from '#db/database.ts';
import { presentMembers } from '#db/members.ts';
import type { Deps } from '../deps.ts';
import { sentBackNotice } from '../mail/notices/sent-back-notice.ts';
import type { Actor } from '../session/actor.ts';
import { resultThatCounts } from '../solving/result-that-counts.ts';
import { actOnRevision } from './act-on-revision.ts';
import { changeState } from './change-state.ts';
import { notify } from './notify.ts';
import { refuseStale } from './refuse-stale.ts';

/** Sends a revision back to its authors, who are told the reason. */
export async function sendBackRevision(
  deps: Pick<Deps, 'newId' | 'publicUrl'>,
  database: Database,
  actor: Pick<Actor, 'member' | 'team'>,
  given: { revisionId: string; overVersion: number; reason: string },
): Promise<void> {
  const { reason } = given;
  await actOnRevision(database, actor, given.revisionId, 'send-back', async (trx, revision) => {
    await refuseStale(trx, revision, given.overVersion);
    const stored = await resultThatCounts(trx, revision);
    await changeState(trx, actor, revision, 'send-back', { reason });
    const authors = await authorsOf(trx, revision.id);
    const recipients = await presentMembers(trx, actor.team.id, authors);
    await notify(deps, trx, actor, revision, recipients, stored?.result ?? null, (facts) =>
      sentBackNotice({ ...facts, reason }),
    );
  });
}

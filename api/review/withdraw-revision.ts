import type { Database } from '#db/database.ts';
import type { Actor } from '../session/actor.ts';
import { actOnRevision } from './act-on-revision.ts';
import { changeState } from './change-state.ts';
import { refuseStale } from './refuse-stale.ts';

/** Withdraws a revision that was not issued; it stays readable. */
export async function withdrawRevision(
  database: Database,
  actor: Pick<Actor, 'member' | 'team'>,
  given: { revisionId: string; overVersion: number; reason: string },
): Promise<void> {
  await actOnRevision(database, actor, given.revisionId, 'withdraw', async (trx, revision) => {
    await refuseStale(trx, revision, given.overVersion);
    await changeState(trx, actor, revision, 'withdraw', { reason: given.reason });
  });
}

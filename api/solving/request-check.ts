import { appendAuditEvent } from '#db/audit-events.ts';
import type { Database } from '#db/database.ts';
import { hasResult } from '#db/results.ts';
import { countConditions } from '#db/sketch-versions.ts';
import { findOpenJob, insertJob, type SolveJob } from '#db/solve-jobs.ts';
import type { Deps } from '../deps.ts';
import { actOnRevision, revisionName } from '../review/act-on-revision.ts';
import type { Actor } from '../session/actor.ts';
import { methodVersion as method } from '#core/thermal/method.ts';

/**
 * Queues the check of the present sketch. A result that is stored already ends the job at once, and a check that is
 * already on its way is not queued a second time.
 */
export async function requestCheck(
  deps: Pick<Deps, 'newId' | 'queue'>,
  database: Database,
  actor: Pick<Actor, 'member' | 'team'>,
  revisionId: string,
): Promise<SolveJob> {
  return actOnRevision(database, actor, revisionId, 'solve', async (trx, revision) => {
    const { sketchHash, sketchVersion } = revision;
    const open = await findOpenJob(trx, revisionId, sketchHash, method);
    if (open) return open;
    const known = await hasResult(trx, actor.team.id, sketchHash, method);
    const job = await insertJob(trx, {
      id: deps.newId(),
      teamId: actor.team.id,
      revisionId,
      sketchVersion,
      inputHash: sketchHash,
      method,
      state: known ? 'done' : 'waiting',
      total: await countConditions(trx, revisionId, sketchVersion),
      requestedBy: actor.member.id,
    });
    if (!job) throw new Error('a locked revision got a second open job');
    if (known) return job;
    await deps.queue.send(trx, job.id);
    await appendAuditEvent(trx, {
      teamId: actor.team.id,
      actor: actor.member,
      kind: 'check.requested',
      subject: revisionName(revision),
      revisionId,
      facts: { sketchVersion, sketchHash, method },
    });
    return job;
  });
}

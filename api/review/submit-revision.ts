import { type FindingReason, sameFinding, submitGuards } from '#core/review/guards.ts';
import { countOpenComments } from '#db/comments.ts';
import type { Database } from '#db/database.ts';
import { replaceReasons } from '#db/finding-reasons.ts';
import { membersWithRole } from '#db/members.ts';
import { findResult } from '#db/results.ts';
import { insertSignature } from '#db/signatures.ts';
import type { Deps } from '../deps.ts';
import { invalid } from '../http/refusal.ts';
import { submittedNotice } from '../mail/notices/submitted-notice.ts';
import type { Actor } from '../session/actor.ts';
import { methodVersion as method } from '#core/thermal/method.ts';
import { actOnRevision } from './act-on-revision.ts';
import { changeState } from './change-state.ts';
import { notify } from './notify.ts';
import { refuseGuarded } from './refuse-guarded.ts';
import { refuseStale } from './refuse-stale.ts';

/** Submits the sketch for review and signs it as authored; every warning carries its reason. */
export async function submitRevision(
  deps: Pick<Deps, 'newId' | 'publicUrl'>,
  database: Database,
  actor: Pick<Actor, 'member' | 'team'>,
  given: { revisionId: string; overVersion: number; reasons: readonly FindingReason[]; note?: string | undefined },
): Promise<void> {
  const { reasons, note = '' } = given;
  await actOnRevision(database, actor, given.revisionId, 'submit', async (trx, revision) => {
    await refuseStale(trx, revision, given.overVersion);
    const stored = await findResult(trx, actor.team.id, revision.sketchHash, method);
    const openComments = await countOpenComments(trx, revision.id);
    refuseGuarded(submitGuards({ result: stored?.result ?? null, reasons, openComments }));
    refuseOddReasons(reasons, stored?.result.findings ?? []);
    await replaceReasons(
      trx,
      revision.id,
      actor.member.id,
      reasons.map((reason) => ({ ...reason, id: deps.newId() })),
    );
    await insertSignature(trx, {
      id: deps.newId(),
      revisionId: revision.id,
      memberId: actor.member.id,
      name: actor.member.name,
      meaning: 'authored',
      sketchVersion: revision.sketchVersion,
    });
    await changeState(trx, actor, revision, 'submit', {
      reason: null,
      facts: { verdict: stored?.result.verdict, reasons, ...(note === '' ? {} : { note }) },
    });
    const reviewers = await membersWithRole(trx, actor.team.id, ['thermal-reviewer']);
    await notify(deps, trx, actor, revision, reviewers, stored?.result ?? null, (facts) =>
      submittedNotice({ ...facts, reason: note }),
    );
  });
}

/** A reason without its finding, or two for one, is a mistake of the sender and not kept silently. */
function refuseOddReasons(reasons: readonly FindingReason[], findings: Parameters<typeof sameFinding>[0][]): void {
  const faults = reasons.flatMap((reason, index) => {
    const path = `reasons[${index}]`;
    if (!findings.some((finding) => sameFinding(finding, reason)))
      return [{ path, message: 'belongs to no finding of this result' }];
    if (reasons.findIndex((other) => sameFinding(other, reason)) < index)
      return [{ path, message: 'is the second reason for the same finding' }];
    return [];
  });
  if (faults.length > 0) throw invalid(faults);
}

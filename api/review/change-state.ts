import type { Knex } from 'knex';
import { transitions, type Transition } from '#core/review/revision-state.ts';
import type { AuditKind } from '#core/review/audit-kinds.ts';
import { appendAuditEvent } from '#db/audit-events.ts';
import { changeRevision, type Revision } from '#db/revisions.ts';
import type { Actor } from '../session/actor.ts';
import { revisionName } from './act-on-revision.ts';

const kinds: Record<Transition, AuditKind> = {
  submit: 'revision.submitted',
  'send-back': 'revision.sent-back',
  clear: 'revision.cleared',
  issue: 'revision.issued',
  withdraw: 'revision.withdrawn',
  supersede: 'revision.superseded',
};

/** Moves a locked revision to its next state, with the audit event of it. */
export async function changeState(
  trx: Knex.Transaction,
  actor: Pick<Actor, 'member' | 'team'>,
  revision: Revision,
  transition: Transition,
  given: { reason?: string | null; resultId?: string; issuedFacts?: object; facts?: Record<string, unknown> } = {},
): Promise<void> {
  const { to } = transitions[transition];
  const changed = await changeRevision(trx, revision.id, revision.version, actor.member.id, {
    state: to,
    ...(given.reason === undefined ? {} : { stateReason: given.reason }),
    ...(given.resultId ? { resultId: given.resultId } : {}),
    ...(given.issuedFacts ? { issuedFacts: given.issuedFacts } : {}),
  });
  if (!changed) throw new Error('a locked revision changed its version');
  await appendAuditEvent(trx, {
    teamId: actor.team.id,
    actor: actor.member,
    kind: kinds[transition],
    subject: revisionName(revision),
    revisionId: revision.id,
    facts: {
      state: { from: revision.state, to },
      version: { from: revision.version, to: changed.version },
      sketchHash: revision.sketchHash,
      ...(given.reason ? { reason: given.reason } : {}),
      ...given.facts,
    },
  });
}

import type { z } from 'zod';
import type { inviteBody } from '#core/contract/people.ts';
import { appendAuditEvent } from '#db/audit-events.ts';
import type { Database } from '#db/database.ts';
import {
  findOpenInvitation,
  insertInvitation,
  type Invitation,
  invitationDays,
  withdrawInvitation,
  withdrawInvitationsTo,
} from '#db/invitations.ts';
import { findByEmail } from '#db/members.ts';
import { transaction } from '#db/transaction.ts';
import type { Deps } from '../deps.ts';
import { notFound, Refusal } from '../http/refusal.ts';
import { invitationNotice } from '../mail/notices/invitation-notice.ts';
import { queueMail } from '../mail/queue-mail.ts';
import type { Actor } from '../session/actor.ts';
import { newToken } from '../session/one-time-token.ts';

/** Invites a person; an earlier open invitation of the same address is taken back. */
export async function invite(
  deps: Deps,
  database: Database,
  actor: Actor,
  given: z.output<typeof inviteBody>,
): Promise<Invitation> {
  const known = await findByEmail(database, given.email);
  if (known?.teamId === actor.team.id)
    throw new Refusal(409, 'already-member', 'Already a member', `${known.name} is a member with this address.`);
  const id = deps.newId();
  const { token, tokenHash } = newToken();
  await withdrawInvitationsTo(database, actor.team.id, given.email);
  await insertInvitation(database, {
    id,
    teamId: actor.team.id,
    ...given,
    tokenHash,
    invitedBy: actor.member.id,
  });
  const notice = invitationNotice(deps.publicUrl, {
    ...given,
    token,
    team: actor.team.name,
    invitedBy: actor.member.name,
    days: invitationDays,
  });
  await queueMail(deps, database, actor.team.id, given, notice);
  await appendAuditEvent(database, {
    teamId: actor.team.id,
    actor: actor.member,
    kind: 'member.invited',
    subject: given.name,
    facts: { email: given.email, roles: given.roles },
  });
  const invitation = await findOpenInvitation(database, actor.team.id, id);
  if (!invitation) throw new Error('an invitation just made was not found');
  return invitation;
}

export async function withdrawOpenInvitation(database: Database, actor: Actor, id: string): Promise<void> {
  await transaction(database, async (trx) => {
    const invitation = await findOpenInvitation(trx, actor.team.id, id);
    if (!invitation) throw notFound('This invitation');
    await withdrawInvitation(trx, id);
    await appendAuditEvent(trx, {
      teamId: actor.team.id,
      actor: actor.member,
      kind: 'invitation.withdrawn',
      subject: invitation.name,
      facts: { email: invitation.email },
    });
  });
}

import { appendAuditEvent } from '#db/audit-events.ts';
import { findInvitationByToken, type Invitation, markAccepted } from '#db/invitations.ts';
import { findByEmail, insertMember } from '#db/members.ts';
import { findLiveSession } from '#db/sessions.ts';
import { transaction } from '#db/transaction.ts';
import type { Deps } from '../deps.ts';
import { Refusal } from '../http/refusal.ts';
import type { Actor } from '../session/actor.ts';
import { limitAttempts, perAddress } from '../session/limit-attempts.ts';
import { hashOfToken } from '../session/one-time-token.ts';
import { openSession } from '../session/open-session.ts';

/** What the link in an invitation mail is for. @throws Refusal 422 where it no longer opens anything */
export async function previewInvitation(deps: Deps, given: { token: string; address: string }): Promise<Invitation> {
  await limitAttempts(deps.database, [{ key: `link address ${given.address}`, limit: perAddress }]);
  const invitation = await findInvitationByToken(deps.database, hashOfToken(given.token));
  if (!invitation) throw linkEnded();
  return invitation;
}

/** Makes the invited person a member, and signs them in. */
export async function acceptInvitation(
  deps: Deps,
  given: { token: string; name: string; password: string; address: string },
): Promise<{ token: string; actor: Actor }> {
  await previewInvitation(deps, given);
  const passwordHash = await deps.passwords.hash(given.password);
  return transaction(deps.database, async (trx) => {
    const invitation = await findInvitationByToken(trx, hashOfToken(given.token));
    if (!invitation || !(await markAccepted(trx, invitation.id))) throw linkEnded();
    if (await findByEmail(trx, invitation.email))
      throw new Refusal(409, 'address-in-use', 'Address in use', 'Somebody signs in with this address already.');
    const member = {
      id: deps.newId(),
      teamId: invitation.teamId,
      name: given.name,
      email: invitation.email,
      roles: invitation.roles,
    };
    await insertMember(trx, { ...member, passwordHash });
    const opened = await openSession(deps, trx, member.id);
    await appendAuditEvent(trx, {
      teamId: member.teamId,
      actor: member,
      kind: 'member.joined',
      subject: member.name,
      facts: { email: member.email, roles: member.roles, invitedBy: invitation.invitedBy },
    });
    const actor = await findLiveSession(trx, opened.id);
    if (!actor) throw new Error('a session just opened was not found');
    return { token: opened.token, actor };
  });
}

const linkEnded = () =>
  new Refusal(422, 'link-ended', 'Link no longer valid', 'The invitation was accepted, taken back or is too old.');

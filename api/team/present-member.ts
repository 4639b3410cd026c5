import type { InvitationView, MemberView } from '#core/contract/people.ts';
import type { Invitation } from '#db/invitations.ts';
import type { Member } from '#db/members.ts';

export function presentMember(member: Member): MemberView {
  const { id, name, email, roles, joinedAt, removedAt } = member;
  return { id, name, email, roles, joinedAt: joinedAt.toISOString(), removedAt: removedAt?.toISOString() ?? null };
}

export function presentInvitation(invitation: Invitation): InvitationView {
  const { id, name, email, roles, invitedBy, createdAt, expiresAt } = invitation;
  return { id, name, email, roles, invitedBy, createdAt: createdAt.toISOString(), expiresAt: expiresAt.toISOString() };
}

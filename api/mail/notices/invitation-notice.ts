import { roleNames, type Role } from '#core/review/role.ts';
import { type Notice, paragraphs } from '../notice.ts';

export function invitationNotice(
  publicUrl: string,
  given: { name: string; team: string; invitedBy: string; roles: readonly Role[]; token: string; days: number },
): Notice {
  const roles = given.roles.map((role) => roleNames[role].toLowerCase()).join(', ');
  return {
    subject: `${given.invitedBy} invites you to ${given.team}`,
    text: paragraphs(
      `Hello ${given.name},`,
      `${given.invitedBy} invites you to the team ${given.team} in Dropwatt, as ${roles}. Accept within ${given.days} days here:`,
      `${publicUrl}/invitations/${given.token}`,
    ),
    holdsToken: true,
  };
}

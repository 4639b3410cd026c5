import type { teamEndpoints } from '#core/contract/team-endpoints.ts';
import { appendAuditEvent } from '#db/audit-events.ts';
import { invitedAddresses, listOpenInvitations } from '#db/invitations.ts';
import { listMembers } from '#db/members.ts';
import { renameTeam } from '#db/teams.ts';
import { transaction } from '#db/transaction.ts';
import { notFound } from '../http/refusal.ts';
import type { Routes } from '../http/route.ts';
import { presentSession } from '../session/present-session.ts';
import { acceptInvitation, previewInvitation } from './accept-invitation.ts';
import { changeMember, removeMember } from './change-member.ts';
import { invite, withdrawOpenInvitation } from './invite.ts';
import { presentInvitation, presentMember } from './present-member.ts';

export const teamRoutes: Routes<keyof typeof teamEndpoints> = {
  readTeam: async ({ actor }) => ({ body: actor.team }),

  renameTeam: async ({ database, actor, body }) =>
    transaction(database, async (trx) => {
      const team = await renameTeam(trx, actor.team.id, body.name);
      await appendAuditEvent(trx, {
        teamId: team.id,
        actor: actor.member,
        kind: 'team.renamed',
        subject: team.name,
        facts: { name: { from: actor.team.name, to: team.name } },
      });
      return { body: team };
    }),

  listMembers: async ({ database, actor }) => ({
    body: { items: (await listMembers(database, actor.team.id)).map(presentMember) },
  }),

  changeMember: async ({ database, actor, params, body }) => ({
    body: presentMember(await changeMember(database, actor, params.memberId, body)),
  }),

  removeMember: async ({ database, actor, params }) => {
    await removeMember(database, actor, params.memberId);
    return {};
  },

  listInvitations: async ({ database, actor }) => ({
    body: { items: (await listOpenInvitations(database, actor.team.id)).map(presentInvitation) },
  }),

  invite: async ({ deps, database, actor, body }) => ({
    body: presentInvitation(await invite(deps, database, actor, body)),
  }),

  withdrawInvitation: async ({ database, actor, params }) => {
    await withdrawOpenInvitation(database, actor, params.invitationId);
    return {};
  },

  previewInvitation: async ({ deps, body, address }) => {
    const { team, name, email, roles } = await previewInvitation(deps, { ...body, address });
    return { body: { team, name, email, roles } };
  },

  acceptInvitation: async ({ deps, body, address }) => {
    const { token, actor } = await acceptInvitation(deps, { ...body, address });
    return { body: presentSession(actor), session: { token, expiresAt: actor.expiresAt } };
  },

  listMail: async ({ deps, database, actor }) => {
    if (!deps.mailFolder) throw notFound();
    const members = await listMembers(database, actor.team.id);
    const own = new Set([...members.map(({ email }) => email), ...(await invitedAddresses(database, actor.team.id))]);
    return { body: { items: (await deps.mailFolder.list()).filter(({ to }) => own.has(to.toLowerCase())) } };
  },
};

import type { sessionEndpoints } from '#core/contract/session-endpoints.ts';
import { appendAuditEvent } from '#db/audit-events.ts';
import { endSession } from '#db/sessions.ts';
import { transaction } from '#db/transaction.ts';
import type { Routes } from '../http/route.ts';
import { changePassword } from './change-password.ts';
import { presentSession } from './present-session.ts';
import { completeReset, requestReset } from './reset-password.ts';
import { signIn } from './sign-in.ts';

export const sessionRoutes: Routes<keyof typeof sessionEndpoints> = {
  readSession: async ({ whoAsks }) => {
    const actor = await whoAsks();
    return { body: actor && presentSession(actor) };
  },

  signIn: async ({ deps, body, address }) => {
    const { token, actor } = await signIn(deps, { ...body, address });
    return { body: presentSession(actor), session: { token, expiresAt: actor.expiresAt } };
  },

  signOut: async ({ database, whoAsks }) => {
    const actor = await whoAsks();
    if (actor)
      await transaction(database, async (trx) => {
        await endSession(trx, actor.id);
        await appendAuditEvent(trx, {
          teamId: actor.team.id,
          actor: actor.member,
          kind: 'session.ended',
          subject: actor.member.name,
        });
      });
    return { session: null };
  },

  changePassword: async ({ deps, actor, body }) => {
    await changePassword(deps, actor, body);
    return {};
  },

  requestReset: async ({ deps, body, address }) => {
    await requestReset(deps, { ...body, address });
    return {};
  },

  completeReset: async ({ deps, body, address }) => {
    await completeReset(deps, { ...body, address });
    return {};
  },
};

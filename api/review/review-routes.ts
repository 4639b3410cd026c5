import type { reviewEndpoints } from '#core/contract/review-endpoints.ts';
import type { Database } from '#db/database.ts';
import type { Routes } from '../http/route.ts';
import { printRecord } from '../record/print-record.ts';
import type { Actor } from '../session/actor.ts';
import { confirmPassword } from '../session/confirm-password.ts';
import { clearRevision } from './clear-revision.ts';
import { commentRoutes } from './comment-routes.ts';
import { issueRevision } from './issue-revision.ts';
import { presentRevision } from './present-revision.ts';
import { sendBackRevision } from './send-back-revision.ts';
import { submitRevision } from './submit-revision.ts';
import { withdrawRevision } from './withdraw-revision.ts';

export const reviewRoutes: Routes<keyof typeof reviewEndpoints> = {
  ...commentRoutes,

  submit: async ({ deps, database, actor, params, overVersion, body }) => {
    await submitRevision(deps, database, actor, { ...params, overVersion, ...body });
    return answer(database, actor, params.revisionId);
  },

  sendBack: async ({ deps, database, actor, params, overVersion, body }) => {
    await sendBackRevision(deps, database, actor, { ...params, overVersion, ...body });
    return answer(database, actor, params.revisionId);
  },

  clear: async ({ deps, database, actor, params, overVersion, body }) => {
    await confirmPassword(deps, actor, body.password, 'password');
    await clearRevision(deps, database, actor, { ...params, overVersion });
    return answer(database, actor, params.revisionId);
  },

  issue: async ({ deps, database, actor, params, overVersion, body }) => {
    await confirmPassword(deps, actor, body.password, 'password');
    await issueRevision(deps, database, actor, { ...params, overVersion });
    return answer(database, actor, params.revisionId);
  },

  withdraw: async ({ database, actor, params, overVersion, body }) => {
    await withdrawRevision(database, actor, { ...params, overVersion, ...body });
    return answer(database, actor, params.revisionId);
  },

  printRecord: async ({ database, revision, query }) => printRecord(database, revision, query.paper),
};

async function answer(database: Database, actor: Actor, revisionId: string) {
  const view = await presentRevision(database, actor, revisionId);
  return { body: view, version: view.version };
}

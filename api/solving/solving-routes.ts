import type { JobView } from '#core/contract/solving.ts';
import type { solvingEndpoints } from '#core/contract/solving-endpoints.ts';
import { appendAuditEvent } from '#db/audit-events.ts';
import { findHeatField } from '#db/heat-fields.ts';
import { cancelJob, findJob, type SolveJob } from '#db/solve-jobs.ts';
import { notFound } from '../http/refusal.ts';
import type { Routes } from '../http/route.ts';
import { actOnRevision, revisionName } from '../review/act-on-revision.ts';
import { littleEndian, unpackHeatField } from './heat-field-pack.ts';
import { requestCheck } from './request-check.ts';
import { resultThatCounts } from './result-that-counts.ts';

export const solvingRoutes: Routes<keyof typeof solvingEndpoints> = {
  solve: async ({ deps, database, actor, params }) => ({
    body: present(await requestCheck(deps, database, actor, params.revisionId)),
  }),

  readJob: async ({ database, params }) => {
    const job = await findJob(database, params.revisionId, params.jobId);
    if (!job) throw notFound('This check');
    return { body: present(job) };
  },

  cancelJob: async ({ database, actor, params }) =>
    actOnRevision(database, actor, params.revisionId, 'solve', async (trx, revision) => {
      const job = await findJob(trx, revision.id, params.jobId);
      if (!job) throw notFound('This check');
      if (await cancelJob(trx, job.id))
        await appendAuditEvent(trx, {
          teamId: actor.team.id,
          actor: actor.member,
          kind: 'check.cancelled',
          subject: revisionName(revision),
          revisionId: revision.id,
          facts: { state: { from: job.state, to: 'cancelled' }, sketchVersion: job.sketchVersion },
        });
      return {};
    }),

  readResult: async ({ database, revision }) => {
    const stored = await resultThatCounts(database, revision);
    if (!stored) return { body: null };
    const { result, sketchVersion, upToDate, solvedAt } = stored;
    return { body: { result, sketchVersion, upToDate, solvedAt: solvedAt.toISOString() } };
  },

  readHeatField: async ({ database, revision, query }) => {
    const stored = await resultThatCounts(database, revision);
    const packed = stored && (await findHeatField(database, stored.id, query.condition));
    if (!packed) throw notFound('This heat field');
    const { columns, rows, xEdgesMm, yEdgesMm, layers } = unpackHeatField(packed);
    return {
      body: {
        condition: query.condition,
        columns,
        rows,
        xEdgesMm: [...xEdgesMm],
        yEdgesMm: [...yEdgesMm],
        layers: layers.map(({ name, temperatureC }) => ({
          name,
          temperatureC: littleEndian(temperatureC).toString('base64'),
        })),
      },
    };
  },
};

function present({ id, state, done, total, message }: SolveJob): JobView {
  return { id, state, done, total, message };
}

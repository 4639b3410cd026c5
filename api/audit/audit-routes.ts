import type { referenceEndpoints } from '#core/contract/reference-endpoints.ts';
import { listAuditEvents } from '#db/audit-events.ts';
import { invalid } from '../http/refusal.ts';
import type { Routes } from '../http/route.ts';

export const auditRoutes: Routes<Extract<keyof typeof referenceEndpoints, 'listAuditEvents'>> = {
  listAuditEvents: async ({ database, actor, query }) => {
    const { limit, revisionId, kind } = query;
    const before = query.cursor === undefined ? null : sequenceOf(query.cursor);
    // One more than asked for tells whether there is a next page.
    const events = await listAuditEvents(database, actor.team.id, { before, limit: limit + 1, revisionId, kind });
    const shown = events.slice(0, limit);
    const last = shown.at(-1);
    return {
      body: {
        items: shown.map((event) => ({ ...event, at: event.at.toISOString() })),
        next: events.length > limit && last ? String(last.sequence) : null,
      },
    };
  },
};

function sequenceOf(cursor: string): number {
  const sequence = /^\d{1,15}$/.test(cursor) ? Number(cursor) : 0;
  if (sequence < 1) throw invalid([{ path: 'cursor', message: 'must be the `next` of the page before' }]);
  return sequence;
}

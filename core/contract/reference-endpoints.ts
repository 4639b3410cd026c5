import { endpoint } from './endpoint.ts';
import { cursor, id } from './identifier.ts';
import { page } from './parameters.ts';
import { auditEventView } from './review.ts';
import { libraryView } from './solving.ts';
import { z } from 'zod';

/** The library and the audit trail. */
export const referenceEndpoints = {
  readLibrary: endpoint({
    method: 'get',
    path: '/library',
    summary: 'Packages, parts, laminates and criteria',
    access: 'member',
    status: 200,
    answer: libraryView,
  }),
  listAuditEvents: endpoint({
    method: 'get',
    path: '/audit-events',
    summary: 'What happened, newest first',
    access: { team: 'read-audit' },
    query: z.strictObject({
      cursor: cursor.optional(),
      limit: z.coerce.number().int().min(1).max(200).default(50),
      revisionId: id.optional(),
      kind: z.string().max(60).optional(),
    }),
    status: 200,
    answer: page(auditEventView),
  }),
} as const;

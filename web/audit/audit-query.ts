import { infiniteQueryOptions } from '@tanstack/react-query';
import { call } from '#web/server/call.ts';

type AuditFilter = { kind?: string; revisionId?: string };

/** Audit events, newest first, page by page. */
export const auditQuery = (filter: AuditFilter) =>
  infiniteQueryOptions({
    queryKey: ['audit', filter] as const,
    queryFn: ({ pageParam, signal }) =>
      call('listAuditEvents', { query: { ...filter, limit: 50, ...(pageParam ? { cursor: pageParam } : {}) }, signal }),
    initialPageParam: null as string | null,
    getNextPageParam: (page) => page.next,
  });

import { queryOptions } from '@tanstack/react-query';
import { call } from '#web/server/call.ts';

/** Packages, parts, laminates and criteria; changes only with the program. */
export const libraryQuery = queryOptions({
  queryKey: ['library'] as const,
  queryFn: ({ signal }) => call('readLibrary', { signal }),
  staleTime: Infinity,
});

import { queryOptions } from '@tanstack/react-query';
import { call } from '#web/server/call.ts';

export const sessionKey = ['session'] as const;

/** Who is signed in; null when nobody is. */
export const sessionQuery = queryOptions({
  queryKey: sessionKey,
  queryFn: ({ signal }) => call('readSession', { signal }),
  staleTime: 60_000,
});

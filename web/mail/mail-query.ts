import { queryOptions } from '@tanstack/react-query';
import { call } from '#web/server/call.ts';

/** Messages caught by the local mail sink. */
export const mailQuery = queryOptions({
  queryKey: ['mail'] as const,
  queryFn: ({ signal }) => call('listMail', { signal }),
});

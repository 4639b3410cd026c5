import { queryOptions } from '@tanstack/react-query';
import { call } from '#web/server/call.ts';

export const teamQuery = queryOptions({
  queryKey: ['team'] as const,
  queryFn: ({ signal }) => call('readTeam', { signal }),
});

export const membersQuery = queryOptions({
  queryKey: ['members'] as const,
  queryFn: ({ signal }) => call('listMembers', { signal }),
});

export const invitationsQuery = queryOptions({
  queryKey: ['invitations'] as const,
  queryFn: ({ signal }) => call('listInvitations', { signal }),
});

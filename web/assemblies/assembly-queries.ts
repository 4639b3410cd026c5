import { queryOptions } from '@tanstack/react-query';
import { call } from '#web/server/call.ts';

export const assembliesKey = ['assemblies'] as const;

export const assembliesQuery = queryOptions({
  queryKey: assembliesKey,
  queryFn: ({ signal }) => call('listAssemblies', { signal }),
});

export const assemblyQuery = (assemblyId: string) =>
  queryOptions({
    queryKey: [...assembliesKey, assemblyId] as const,
    queryFn: ({ signal }) => call('readAssembly', { params: { assemblyId }, signal }),
  });

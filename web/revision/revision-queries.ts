import { queryOptions } from '@tanstack/react-query';
import { call, callWritten } from '#web/server/call.ts';

/** Everything of one revision lies under this key, so one invalidation refreshes it all. */
export const revisionKey = (revisionId: string) => ['revision', revisionId] as const;

export const revisionQuery = (revisionId: string) =>
  queryOptions({
    queryKey: [...revisionKey(revisionId), 'state'] as const,
    queryFn: ({ signal }) => call('readRevision', { params: { revisionId }, signal }),
  });

/** The sketch: `board` with every default filled in, `written` as it is stored. */
export const sketchQuery = (revisionId: string) =>
  queryOptions({
    queryKey: [...revisionKey(revisionId), 'sketch'] as const,
    queryFn: async ({ signal }) => {
      const { answer, written } = await callWritten('readSketch', { params: { revisionId }, signal });
      return { ...answer, written: written.board };
    },
  });

export const sketchVersionsQuery = (revisionId: string) =>
  queryOptions({
    queryKey: [...revisionKey(revisionId), 'sketch-versions'] as const,
    queryFn: ({ signal }) => call('listSketchVersions', { params: { revisionId }, signal }),
  });

/** Newest result; null while there is none. */
export const resultQuery = (revisionId: string) =>
  queryOptions({
    queryKey: [...revisionKey(revisionId), 'result'] as const,
    queryFn: ({ signal }) => call('readResult', { params: { revisionId }, signal }),
  });

/** Heat field of one condition of the result that was solved at `solvedAt`. */
export const heatFieldQuery = (revisionId: string, condition: string, solvedAt: string) =>
  queryOptions({
    queryKey: [...revisionKey(revisionId), 'field', solvedAt, condition] as const,
    queryFn: ({ signal }) => call('readHeatField', { params: { revisionId }, query: { condition }, signal }),
    staleTime: Infinity,
  });

export const commentsQuery = (revisionId: string) =>
  queryOptions({
    queryKey: [...revisionKey(revisionId), 'comments'] as const,
    queryFn: ({ signal }) => call('listComments', { params: { revisionId }, signal }),
  });

/** A check in the queue; asked again every second until it has ended. */
export const jobQuery = (revisionId: string, jobId: string) =>
  queryOptions({
    queryKey: [...revisionKey(revisionId), 'job', jobId] as const,
    queryFn: ({ signal }) => call('readJob', { params: { revisionId, jobId }, signal }),
    staleTime: 0,
    refetchInterval: ({ state }) =>
      state.data && state.data.state !== 'waiting' && state.data.state !== 'running' ? false : 700,
  });

import { endpoint } from './endpoint.ts';
import { id } from './identifier.ts';
import { revisionParams } from './parameters.ts';
import { heatFieldView, jobView, storedResult } from './solving.ts';
import { z } from 'zod';

/** Checks of a revision: jobs, results, heat fields. */
export const solvingEndpoints = {
  solve: endpoint({
    method: 'post',
    path: '/revisions/{revisionId}/solve',
    summary: 'Queue the check of the present sketch; a stored result is reused',
    access: { revision: 'solve' },
    params: revisionParams,
    status: 202,
    answer: jobView,
  }),
  readJob: endpoint({
    method: 'get',
    path: '/revisions/{revisionId}/jobs/{jobId}',
    summary: 'Progress of a check',
    access: 'member',
    params: z.strictObject({ revisionId: id, jobId: id }),
    status: 200,
    answer: jobView,
  }),
  cancelJob: endpoint({
    method: 'delete',
    path: '/revisions/{revisionId}/jobs/{jobId}',
    summary: 'Cancel a check',
    access: { revision: 'solve' },
    params: z.strictObject({ revisionId: id, jobId: id }),
    status: 204,
    answer: null,
  }),
  readResult: endpoint({
    method: 'get',
    path: '/revisions/{revisionId}/result',
    summary: 'Newest result; null while there is none',
    access: 'member',
    params: revisionParams,
    status: 200,
    answer: storedResult.nullable(),
  }),
  readHeatField: endpoint({
    method: 'get',
    path: '/revisions/{revisionId}/result/field',
    summary: 'Heat field of one condition',
    access: 'member',
    params: revisionParams,
    query: z.strictObject({ condition: z.string().max(200) }),
    status: 200,
    answer: heatFieldView,
  }),
} as const;

import { boardDocument } from '#core/board/document.ts';
import { revisionView, sketchVersionView, sketchView } from './assemblies.ts';
import { endpoint } from './endpoint.ts';
import { id } from './identifier.ts';
import { list, revisionParams } from './parameters.ts';
import { z } from 'zod';

/** One revision: its state and its board document. */
export const sketchEndpoints = {
  readRevision: endpoint({
    method: 'get',
    path: '/revisions/{revisionId}',
    summary: 'State, people and what the caller may do',
    access: 'member',
    params: revisionParams,
    status: 200,
    answer: revisionView,
  }),
  readSketch: endpoint({
    method: 'get',
    path: '/revisions/{revisionId}/sketch',
    summary: 'The board document',
    access: 'member',
    params: revisionParams,
    status: 200,
    answer: sketchView,
  }),
  saveSketch: endpoint({
    method: 'put',
    path: '/revisions/{revisionId}/sketch',
    summary: 'Save the board document',
    access: { revision: 'edit' },
    params: revisionParams,
    body: boardDocument,
    status: 200,
    answer: sketchVersionView,
    ifMatch: true,
  }),
  listSketchVersions: endpoint({
    method: 'get',
    path: '/revisions/{revisionId}/sketch/versions',
    summary: 'Who saved when, newest first',
    access: 'member',
    params: revisionParams,
    status: 200,
    answer: list(sketchVersionView),
  }),
  readSketchVersion: endpoint({
    method: 'get',
    path: '/revisions/{revisionId}/sketch/versions/{version}',
    summary: 'An earlier board document',
    access: 'member',
    params: z.strictObject({ revisionId: id, version: z.coerce.number().int().min(1).max(1e9) }),
    status: 200,
    answer: sketchView,
  }),
} as const;

import { endpoint } from './endpoint.ts';
import { z } from 'zod';

/** The service itself. */
export const serviceEndpoints = {
  health: endpoint({
    method: 'get',
    path: '/health',
    summary: 'The process runs',
    access: 'public',
    status: 200,
    answer: z.strictObject({ status: z.literal('ok') }),
  }),
  ready: endpoint({
    method: 'get',
    path: '/health/ready',
    summary: 'Database, migrations and worker are there',
    access: 'public',
    status: 200,
    answer: z.strictObject({
      status: z.enum(['ready', 'not ready']),
      database: z.boolean(),
      migrations: z.boolean(),
      worker: z.boolean(),
    }),
  }),
  openApi: endpoint({
    method: 'get',
    path: '/openapi.json',
    summary: 'This description',
    access: 'public',
    status: 200,
    answer: 'json',
  }),
  boardSchema: endpoint({
    method: 'get',
    path: '/board-schema.json',
    summary: 'JSON Schema of the board document',
    access: 'public',
    status: 200,
    answer: 'json',
  }),
} as const;

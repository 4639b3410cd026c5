import { z } from 'zod';
import { boardDocument } from '#core/board/document.ts';
import type { serviceEndpoints } from '#core/contract/service-endpoints.ts';
import type { Routes } from '../http/route.ts';
import { openApiDocument } from './open-api-document.ts';
import { readiness } from './readiness.ts';

export const serviceRoutes: Routes<keyof typeof serviceEndpoints> = {
  health: async () => ({ body: { status: 'ok' } }),

  ready: async ({ deps }) => {
    const body = await readiness(deps);
    return { body, status: body.status === 'ready' ? 200 : 503 };
  },

  openApi: async ({ deps }) => ({ body: openApiDocument(deps.publicUrl) }),

  boardSchema: async () => ({ body: z.toJSONSchema(boardDocument, { io: 'input' }) }),
};

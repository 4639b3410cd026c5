import { z } from 'zod';
import { createDocument, type ZodOpenApiOperationObject, type ZodOpenApiPathsObject } from 'zod-openapi';
import type { Endpoint } from '#core/contract/endpoint.ts';
import { endpoints } from '#core/contract/endpoints.ts';
import { problem } from '#core/contract/problem.ts';
import { cookieName } from '../http/session-cookie.ts';

/** OpenAPI 3.1 of the whole API, made from the endpoint table. */
export function openApiDocument(publicUrl: string) {
  const paths: ZodOpenApiPathsObject = {};
  for (const [name, endpoint] of Object.entries<Endpoint>(endpoints)) {
    paths[endpoint.path] = { ...paths[endpoint.path], [endpoint.method]: operation(name, endpoint) };
  }
  return createDocument({
    openapi: '3.1.0',
    info: {
      title: 'Dropwatt',
      version: '1',
      description:
        'Checks of linear regulators on their boards. Errors are problem documents (RFC 9457) with a stable `code`.',
    },
    servers: [{ url: `${publicUrl}/api/v1` }],
    components: {
      securitySchemes: {
        session: { type: 'apiKey', in: 'cookie', name: cookieName, description: 'Set by POST /session.' },
      },
    },
    paths,
  });
}

function operation(name: string, endpoint: Endpoint): ZodOpenApiOperationObject {
  return {
    operationId: name,
    summary: endpoint.summary,
    tags: [endpoint.path.split('/')[1] ?? ''],
    security: endpoint.access === 'public' ? [] : [{ session: [] }],
    ...(rights(endpoint) ? { description: rights(endpoint) } : {}),
    requestParams: {
      ...(endpoint.params ? { path: asObject(endpoint.params) } : {}),
      ...(endpoint.query ? { query: asObject(endpoint.query) } : {}),
      ...(endpoint.ifMatch || endpoint.idempotent ? { header: headers(endpoint) } : {}),
    },
    ...(endpoint.body
      ? { requestBody: { required: true, content: { 'application/json': { schema: endpoint.body } } } }
      : {}),
    responses: responses(endpoint),
  };
}

function rights({ access }: Endpoint): string {
  if (typeof access === 'string') return '';
  return `Needs the right “${'team' in access ? access.team : access.revision}”.`;
}

function headers(endpoint: Endpoint) {
  return z.object({
    ...(endpoint.ifMatch
      ? { 'If-Match': z.string().meta({ description: 'Version of the revision in double quotes, as in its ETag.' }) }
      : {}),
    ...(endpoint.idempotent
      ? {
          'Idempotency-Key': z
            .string()
            .optional()
            .meta({ description: '8 to 200 visible characters; the same key and body get the same answer.' }),
        }
      : {}),
  });
}

function responses(endpoint: Endpoint): ZodOpenApiOperationObject['responses'] {
  const answer = answerContent(endpoint.answer);
  return {
    [`${endpoint.status}` as const]: {
      description: 'Done',
      ...(answer ? { content: answer } : {}),
      ...(endpoint.ifMatch ? { headers: z.object({ ETag: z.string() }) } : {}),
    },
    default: { description: 'Refused', content: { 'application/problem+json': { schema: problem } } },
  };
}

function answerContent(answer: Endpoint['answer']) {
  if (answer === null) return null;
  if (answer === 'pdf') return { 'application/pdf': { schema: { type: 'string', format: 'binary' } } } as const;
  if (answer === 'json') return { 'application/json': { schema: { type: 'object' } } } as const;
  return { 'application/json': { schema: answer } };
}

function asObject(schema: z.ZodType): z.ZodObject {
  if (schema instanceof z.ZodObject) return schema;
  throw new Error('parameters of an endpoint must be an object');
}

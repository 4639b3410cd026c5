import { beforeAll, expect, test } from 'vitest';
import { endpoints } from '#core/contract/endpoints.ts';
import { beat } from '#db/worker-heartbeats.ts';
import { testDatabase } from '../support/database.ts';
import { openService, type Service } from '../support/service.ts';

const database = testDatabase();
let service: Service;
beforeAll(() => {
  service = openService(database);
});

test('health – says so without a database; readiness – waits for a worker', async () => {
  expect((await service.anyone().get('/api/v1/health')).body).toEqual({ status: 'ok' });
  const before = await service.anyone().get('/api/v1/health/ready');
  expect([before.status, before.body]).toEqual([
    503,
    { status: 'not ready', database: true, migrations: true, worker: false },
  ]);
  await beat(database.knex, '7c0e3e1e-5d0c-4e6a-9d61-3a8a6f1f5b11');
  expect((await service.anyone().get('/api/v1/health/ready')).body.status).toBe('ready');
});

test('OpenAPI – every endpoint of the table – stands in it with its problems', async () => {
  const { body } = await service.anyone().get('/api/v1/openapi.json').expect(200);
  expect(body.openapi).toMatch(/^3\.1/);
  for (const [name, endpoint] of Object.entries(endpoints)) {
    const found = Object.entries(body.paths as Record<string, Record<string, unknown>>).find(([path]) =>
      path.endsWith(endpoint.path),
    );
    expect(found?.[1][endpoint.method], name).toBeDefined();
  }
  // Every reference leads to something.
  const text = JSON.stringify(body);
  for (const [, name] of text.matchAll(/"#\/components\/schemas\/([^"]+)"/g))
    expect(body.components.schemas[name!], name).toBeDefined();
});

test('headers – of every answer – carry the policy and an id, and no name of the server', async () => {
  const answer = await service.anyone().get('/api/v1/health');
  expect(answer.headers['content-security-policy']).toContain("script-src 'self'");
  expect(answer.headers['content-security-policy']).not.toContain('unsafe-eval;');
  expect(answer.headers['x-request-id']).toBeDefined();
  expect(answer.headers['x-powered-by']).toBeUndefined();
});

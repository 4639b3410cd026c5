import { afterAll, expect, test } from 'vitest';
import { openDatabase } from '#db/connection.ts';
import { signSessionToken } from '#api/session/session-token.ts';
import { openService, sessionSecret } from '../support/service.ts';

// Port 1 (tcpmux) is listened to by nobody: every connection is refused at once.
const url = 'postgres://app@127.0.0.1:1/away';
const knex = openDatabase(url);
const service = openService({ knex, url });
afterAll(() => knex.destroy());

const token = signSessionToken(sessionSecret, '5f0c9a52-7a52-4f0e-9a39-0f5a6ad0a1b7', new Date('2100-01-01'));
const ask = (path: string) => service.anyone().get(`/api/v1${path}`).set('Cookie', `dropwatt_session=${token}`);

test('without a database – health – answers, also with a session in the cookie', async () => {
  expect((await ask('/health')).status).toBe(200);
});

test('without a database – readiness – says which part is missing', async () => {
  const answer = await ask('/health/ready');
  expect([answer.status, answer.body.database, answer.body.status]).toEqual([503, false, 'not ready']);
});

test('without a database – everything else – is a 503 problem with a time to wait, without a word of the inside', async () => {
  const answer = await ask('/assemblies');
  expect([answer.status, answer.type, answer.body.code]).toEqual([503, 'application/problem+json', 'unavailable']);
  expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
  expect(answer.text).not.toMatch(/ECONN|127\.0\.0\.1|stack/);
});

import { afterEach, expect, test, vi } from 'vitest';
import { call } from '#web/server/call.ts';
import { ProblemError } from '#web/server/problem-error.ts';

const revisionId = '6f9d7c52-9d3e-4c39-8a3b-0d0c6a1c5e11';
const session = {
  member: { id: revisionId, name: 'Ingrid', email: 'ingrid@demo.example', roles: ['administrator'] },
  team: { id: revisionId, name: 'Drive Electronics' },
  allowed: [],
  expiresAt: '2026-12-01T10:00:00Z',
};

afterEach(() => vi.unstubAllGlobals());

function answer(status: number, body: unknown) {
  const fetched = vi.fn<typeof fetch>(() => Promise.resolve(Response.json(body, { status })));
  vi.stubGlobal('fetch', fetched);
  return fetched;
}

async function failure(promise: Promise<unknown>): Promise<ProblemError> {
  const error: unknown = await promise.catch((reason: unknown) => reason);
  if (!(error instanceof ProblemError)) throw new Error('expected a ProblemError');
  return error;
}

test('call – an answer of the agreed form – parsed', async () => {
  answer(200, session);
  expect(await call('readSession')).toEqual(session);
});

test('call – a problem document – thrown with its code and the fault of each field', async () => {
  answer(422, {
    type: 'about:blank',
    title: 'Not accepted',
    status: 422,
    code: 'invalid-body',
    detail: 'One field was refused.',
    faults: [{ path: 'number', message: 'is taken' }],
  });
  const error = await failure(call('createAssembly', { body: { number: 'PCA-1', title: 'x' } }));
  expect(error.code).toBe('invalid-body');
  expect(error.faultAt('number')).toBe('is taken');
  expect(error.faultAt('title')).toBeUndefined();
});

test('call – no connection – problem “offline”', async () => {
  vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
  expect((await failure(call('readSession'))).code).toBe('offline');
});

test('call – an answer of another form, or an error page of a proxy – problem “unreadable-answer”', async () => {
  answer(200, { ...session, member: 'Ingrid' });
  expect((await failure(call('readSession'))).code).toBe('unreadable-answer');
  vi.stubGlobal('fetch', () => Promise.resolve(new Response('<h1>Bad gateway</h1>', { status: 502 })));
  const error = await failure(call('readSession'));
  expect([error.code, error.status]).toEqual(['unreadable-answer', 502]);
});

test('call – parameters, version and key – in path, query, If-Match and Idempotency-Key', async () => {
  const fetched = answer(404, {});
  await failure(call('readHeatField', { params: { revisionId }, query: { condition: 'Hot & high' } }));
  expect(fetched.mock.calls[0]?.[0]).toBe(`/api/v1/revisions/${revisionId}/result/field?condition=Hot+%26+high`);
  await failure(call('sendBack', { params: { revisionId }, body: { reason: 'Too hot' }, ifMatch: 7 }));
  await failure(call('comment', { params: { revisionId }, body: { text: 'Why?' }, idempotencyKey: 'k1' }));
  const headers = fetched.mock.calls.map(([, init]) => new Headers(init?.headers));
  expect(headers[1]?.get('if-match')).toBe('"7"');
  expect(headers[2]?.get('idempotency-key')).toBe('k1');
});

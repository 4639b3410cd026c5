import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, test } from 'vitest';
import type { Endpoint } from '#core/contract/endpoint.ts';
import { endpoints } from '#core/contract/endpoints.ts';
import { revisionRules, teamRules } from '#core/review/permissions.ts';
import { testDatabase } from '../support/database.ts';
import { newRevision } from '../support/revision-steps.ts';
import { addTeam, type Agent, allRoles, openService, type Service, type Team } from '../support/service.ts';

const database = testDatabase();
let service: Service;
let ours: Team;
let place: Record<string, string>;
const table: [string, Endpoint][] = Object.entries(endpoints);

beforeAll(async () => {
  service = openService(database);
  ours = await addTeam(service, database, 'Ours');
  const designer = await ours.signIn('layout-designer');
  const { assemblyId, revisionId } = await newRevision(designer);
  place = {
    assemblyId,
    revisionId,
    jobId: randomUUID(),
    commentId: randomUUID(),
    memberId: randomUUID(),
    invitationId: randomUUID(),
    version: '1',
  };
});

const address = ({ path }: Endpoint, values: Record<string, string>) =>
  `/api/v1${path.replace(/\{(\w+)\}/g, (_, key: string) => values[key]!)}`;

function ask(agent: Agent, endpoint: Endpoint, values = place, body: object = {}) {
  const request = agent[endpoint.method](address(endpoint, values));
  if (endpoint.ifMatch) void request.set('If-Match', '"1"');
  return endpoint.method === 'get' ? request : request.send(body);
}

const guarded = table.filter(([, endpoint]) => endpoint.access !== 'public');

describe('every guarded endpoint', () => {
  test.each(guarded)('%s – signed out – is a 401 problem', async (_name, endpoint) => {
    const answer = await ask(service.anyone(), endpoint);
    expect(answer.status).toBe(401);
    expect(answer.type).toBe('application/problem+json');
    expect(answer.body.code).toBe('signed-out');
  });

  const rights = guarded.filter(([, endpoint]) => typeof endpoint.access === 'object');
  test.each(rights)('%s – every role without the right – is a 403 problem', async (_name, endpoint) => {
    const access = endpoint.access as Exclude<Endpoint['access'], string>;
    const holders = 'team' in access ? teamRules[access.team] : revisionRules[access.revision].roles;
    for (const role of allRoles.filter((candidate) => !holders.includes(candidate))) {
      const answer = await ask(await ours.signIn(role), endpoint);
      expect([answer.status, answer.body.code], role).toEqual([403, 'role']);
    }
  });

  const placed = guarded.filter(([, endpoint]) => /\{(assemblyId|revisionId)\}/.test(endpoint.path));
  test.each(placed)('%s – from another team – does not exist', async (_name, endpoint) => {
    const theirs = await addTeam(service, database, `T${randomUUID().slice(0, 8)}`);
    for (const role of allRoles) {
      const answer = await ask(await theirs.signIn(role), endpoint);
      expect(answer.status, role).toBe(404);
    }
  });

  test.each(placed)('%s – an id that is none – does not exist', async (_name, endpoint) => {
    const agent = await ours.signIn('layout-designer');
    const values = Object.fromEntries(Object.keys(place).map((key) => [key, '99999999999']));
    expect((await ask(agent, endpoint, values)).status).toBe(404);
  });
});

describe('every endpoint with a body', () => {
  const bodies = table.filter(([, endpoint]) => endpoint.body);
  test.each(bodies)('%s – an unknown field and nothing else – names its faults', async (_name, endpoint) => {
    const access = endpoint.access;
    const role =
      typeof access === 'string'
        ? 'layout-designer'
        : 'team' in access
          ? teamRules[access.team][0]!
          : revisionRules[access.revision].roles[0]!;
    const agent = access === 'public' ? service.anyone() : await ours.signIn(role);
    const answer = await ask(agent, endpoint, place, { shoeSize: 43 });
    expect(answer.status).toBe(422);
    expect(answer.body.faults.length).toBeGreaterThan(0);
    const paths = answer.body.faults.map(({ path }: { path: string }) => path);
    // A board of no version is refused by that before its fields are looked at.
    if (endpoint.path !== '/revisions/{revisionId}/sketch') expect(paths).toContain('shoeSize');
  });
});

describe('hostile requests', () => {
  const post = async (body: string, type = 'application/json') => {
    const agent = await ours.signIn('layout-designer');
    return agent.post('/api/v1/assemblies').set('Content-Type', type).send(body);
  };
  test('broken JSON – is a 400 problem', async () => {
    const answer = await post('{"number":');
    expect([answer.status, answer.type]).toEqual([400, 'application/problem+json']);
  });
  test('200 000 nested lists – are refused, not a fault of the server', async () => {
    const answer = await post(`{"number":"N","title":"T","board":${'['.repeat(200_000)}${']'.repeat(200_000)}}`);
    expect([400, 413, 422]).toContain(answer.status);
  });
  test('a prototype in the body – is refused', async () => {
    expect((await post('{"__proto__":{"isAdmin":true}}')).status).toBeGreaterThanOrEqual(400);
    expect(({} as Record<string, unknown>).isAdmin).toBeUndefined();
  });
  test('NUL in a text – is refused by its field', async () => {
    const answer = await post(JSON.stringify({ number: 'A\u0000B', title: 'T' }));
    expect(answer.status).toBe(422);
  });
  test('another content type – is refused', async () => {
    expect((await post('number=1', 'application/x-www-form-urlencoded')).status).toBe(415);
  });
  test('an unknown address of the API – is a 404 problem', async () => {
    const answer = await service.anyone().get('/api/v1/nothing');
    expect([answer.status, answer.type]).toEqual([404, 'application/problem+json']);
  });
});

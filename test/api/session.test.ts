import { beforeAll, expect, test } from 'vitest';
import { testDatabase } from '../support/database.ts';
import { addTeam, openService, password, type Service, type Team } from '../support/service.ts';

const database = testDatabase();
let service: Service;
let team: Team;
beforeAll(async () => {
  service = openService(database);
  team = await addTeam(service, database, 'Session');
});

const session = '/api/v1/session';
const isSignedIn = async (agent: ReturnType<Service['anyone']>) => (await agent.get(session)).body !== null;

test('sign-in – right password – opens a session in a guarded cookie', async () => {
  const answer = await service
    .anyone()
    .post(session)
    .send({ email: team.emailOf('administrator').toUpperCase(), password });
  expect(answer.status).toBe(200);
  expect(answer.body.member.roles).toEqual(['administrator']);
  const cookie = String(answer.headers['set-cookie']);
  expect(cookie).toMatch(/HttpOnly/i);
  expect(cookie).toMatch(/SameSite=Lax/i);
});

test('sign-in – wrong password and unknown account – are answered alike', async () => {
  const wrong = await service
    .anyone()
    .post(session)
    .send({ email: team.emailOf('test-engineer'), password: 'wrong password' });
  const unknown = await service
    .anyone()
    .post(session)
    .send({ email: 'nobody@nowhere.example', password: 'wrong password' });
  expect([wrong.status, unknown.status]).toEqual([401, 401]);
  expect({ ...wrong.body, instance: '' }).toEqual({ ...unknown.body, instance: '' });
});

test('sign-out – ends the session on the server', async () => {
  const agent = await team.signIn('layout-designer');
  const cookie = (await agent.get(session)).request.cookies;
  await agent.delete(session).expect(204);
  const again = await service
    .anyone()
    .get('/api/v1/assemblies')
    .set('Cookie', String(cookie ?? ''));
  expect(again.status).toBe(401);
  expect(await isSignedIn(agent)).toBe(false);
});

test('a removed member – is out at once', async () => {
  const administrator = await team.signIn('administrator');
  const engineer = await team.signIn('test-engineer');
  const members = await administrator.get('/api/v1/members').expect(200);
  const found = members.body.items.find((member: { email: string }) => member.email === team.emailOf('test-engineer'));
  await administrator.delete(`/api/v1/members/${found.id}`).expect(204);
  expect((await engineer.get('/api/v1/assemblies')).status).toBe(401);
});

test('a changed password – ends every other session', async () => {
  const here = await team.signIn('hardware-lead');
  const there = await team.signIn('hardware-lead');
  await here
    .put(`${session}/password`)
    .send({ currentPassword: password, newPassword: 'eleven copper sluices' })
    .expect(204);
  expect(await isSignedIn(here)).toBe(true);
  expect(await isSignedIn(there)).toBe(false);
});

test.each([
  ['Sec-Fetch-Site', 'cross-site'],
  ['Sec-Fetch-Site', 'same-site'],
  ['Origin', 'https://elsewhere.example'],
])('a change – with %s %s – is refused', async (header, value) => {
  const agent = await team.signIn('layout-designer');
  const answer = await agent.post('/api/v1/assemblies').set(header, value).send({ number: 'X', title: 'X' });
  expect(answer.status).toBe(403);
});

test('failed sign-ins – many for one account – are slowed down with a time to wait', async () => {
  const statuses: number[] = [];
  for (let tries = 0; tries < 40 && !statuses.includes(429); tries++) {
    const answer = await service
      .anyone()
      .post(session)
      .send({ email: team.emailOf('quality-engineer'), password: 'wrong again' });
    statuses.push(answer.status);
    if (answer.status === 429) expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
  }
  expect(statuses).toContain(429);
});

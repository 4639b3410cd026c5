import nodemailer from 'nodemailer';
import { SMTPServer } from 'smtp-server';
import { beforeAll, expect, test } from 'vitest';
import { sendWaitingMails } from '#api/mail/send-waiting-mails.ts';
import { testDatabase } from '../support/database.ts';
import { addTeam, type Agent, logger, openService, password, type Service, type Team } from '../support/service.ts';

const database = testDatabase();
let service: Service;
let team: Team;
let administrator: Agent;
beforeAll(async () => {
  service = openService(database);
  team = await addTeam(service, database, 'People');
  administrator = await team.signIn('administrator');
});

async function tokenTo(recipient: string, place: string): Promise<string> {
  const [mail] = await database.knex('mail_outbox').where({ recipient }).orderBy('created_at', 'desc').limit(1);
  const found = new RegExp(`/${place}/([\\w-]+)`).exec(String(mail?.text));
  if (!found) throw new Error(`no link to ${place} in the mail to ${recipient}`);
  return found[1]!;
}

test('invitation – its link – lets in once, with the roles that were given', async () => {
  const invited = { name: 'Pia Lindqvist', email: 'pia@people.example', roles: ['thermal-reviewer'] };
  await administrator.post('/api/v1/invitations').send(invited).expect(201);
  const token = await tokenTo(invited.email, 'invitations');
  const preview = await service.anyone().post('/api/v1/invitations/preview').send({ token }).expect(200);
  expect(preview.body).toMatchObject({ team: 'People', email: invited.email });
  const accept = () =>
    service
      .anyone()
      .post('/api/v1/invitations/accept')
      .send({ token, name: 'Pia Lindqvist', password: 'seven quiet canals' });
  const accepted = await accept();
  expect(accepted.status).toBe(200);
  expect(accepted.body.member.roles).toEqual(['thermal-reviewer']);
  expect((await accept()).status).toBeGreaterThanOrEqual(400);
});

test('reset – known and unknown address – are answered alike; the link works once', async () => {
  const ask = (email: string) => service.anyone().post('/api/v1/password-resets').send({ email });
  const [known, unknown] = [await ask(team.emailOf('test-engineer')), await ask('nobody@nowhere.example')];
  expect([known.status, unknown.status]).toEqual([202, 202]);
  const token = await tokenTo(team.emailOf('test-engineer'), 'password-reset');
  const complete = () =>
    service.anyone().post('/api/v1/password-resets/complete').send({ token, password: 'three slow barges' });
  expect((await complete()).status).toBe(204);
  expect((await complete()).status).toBeGreaterThanOrEqual(400);
  const signIn = (given: string) =>
    service
      .anyone()
      .post('/api/v1/session')
      .send({ email: team.emailOf('test-engineer'), password: given });
  expect((await signIn(password)).status).toBe(401);
  expect((await signIn('three slow barges')).status).toBe(200);
});

test('members – the last administrator – cannot give the role away', async () => {
  const members = await administrator.get('/api/v1/members').expect(200);
  const own = members.body.items.find(({ email }: { email: string }) => email === team.emailOf('administrator'));
  const answers = [
    await administrator.patch(`/api/v1/members/${own.id}`).send({ roles: ['test-engineer'] }),
    await administrator.delete(`/api/v1/members/${own.id}`),
  ];
  for (const answer of answers) expect([answer.status, answer.body.code]).toEqual([409, 'last-administrator']);
});

test('members and invitations – to the administrator of another team – do not exist', async () => {
  const theirs = await (await addTeam(service, database, 'Neighbours')).signIn('administrator');
  const [{ id: memberId }] = (await administrator.get('/api/v1/members')).body.items;
  const invited = { name: 'Ole', email: 'ole@people.example', roles: ['test-engineer'] };
  const invitation = await administrator.post('/api/v1/invitations').send(invited).expect(201);
  await theirs.patch(`/api/v1/members/${memberId}`).send({ name: 'Mine' }).expect(404);
  await theirs.delete(`/api/v1/members/${memberId}`).expect(404);
  await theirs.delete(`/api/v1/invitations/${invitation.body.id}`).expect(404);
  expect((await theirs.get('/api/v1/invitations')).body.items).toEqual([]);
  await administrator.delete(`/api/v1/invitations/${invitation.body.id}`).expect(204);
});

test('invitation and reset – links that are too old – open nothing', async () => {
  const invited = { name: 'Late', email: 'late@people.example', roles: ['test-engineer'] };
  await administrator.post('/api/v1/invitations').send(invited).expect(201);
  const invitation = await tokenTo(invited.email, 'invitations');
  await service
    .anyone()
    .post('/api/v1/password-resets')
    .send({ email: team.emailOf('layout-designer') });
  const reset = await tokenTo(team.emailOf('layout-designer'), 'password-reset');
  const { knex } = database;
  for (const table of ['invitations', 'password_resets'])
    await knex(table).update({ expires_at: knex.raw("now() - interval '1 s'") });
  const accepted = await service
    .anyone()
    .post('/api/v1/invitations/accept')
    .send({ token: invitation, name: 'Late', password: 'seven quiet canals' });
  expect([accepted.status, accepted.body.code]).toEqual([422, 'link-ended']);
  const completed = await service
    .anyone()
    .post('/api/v1/password-resets/complete')
    .send({ token: reset, password: 'seven quiet canals' });
  expect([completed.status, completed.body.code]).toEqual([422, 'link-ended']);
});

test('outbox – accepted, refused for now, refused for good – is sent once, kept, given up', async () => {
  const seen: string[] = [];
  const refusals = new Map([
    ['later@people.example', 451],
    ['never@people.example', 550],
  ]);
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onRcptTo: ({ address }, _session, answer) => {
      const code = refusals.get(address);
      answer(code ? Object.assign(new Error('refused'), { responseCode: code }) : undefined);
    },
    onData: (stream, _session, answer) => {
      let text = '';
      stream.on('data', (chunk: Buffer) => (text += chunk.toString()));
      stream.on('end', () => {
        seen.push(text);
        answer();
      });
    },
  });
  await new Promise<void>((ready) => server.listen(0, '127.0.0.1', ready));
  const { port } = server.server.address() as { port: number };
  const transport = nodemailer.createTransport({ host: '127.0.0.1', port, ignoreTLS: true });
  await database.knex('mail_outbox').update({ sent_at: database.knex.fn.now() });
  for (const recipient of ['fine@people.example', ...refusals.keys()]) {
    await administrator
      .post('/api/v1/invitations')
      .send({ name: 'Somebody', email: recipient, roles: ['test-engineer'] })
      .expect(201);
  }
  await sendWaitingMails(database.knex, transport, 'Dropwatt <dropwatt@people.example>', logger);
  await sendWaitingMails(database.knex, transport, 'Dropwatt <dropwatt@people.example>', logger);
  transport.close();
  await new Promise<void>((closed) => server.close(closed));
  const rows = await database
    .knex('mail_outbox')
    .whereLike('recipient', '%@people.example')
    .whereNotIn('recipient', ['pia@people.example', 'ole@people.example', 'late@people.example']);
  const of = (recipient: string) => rows.find((row) => row.recipient === recipient);
  expect(seen).toHaveLength(1);
  expect(seen[0]).toContain(of('fine@people.example').message_id);
  expect(of('fine@people.example').sent_at).not.toBeNull();
  // The link lets its reader in, so it is not kept once it is on its way.
  expect(of('fine@people.example').text).toBe('');
  expect(of('later@people.example')).toMatchObject({ sent_at: null, failed_at: null });
  expect(of('never@people.example').failed_at).not.toBeNull();
  const told = await administrator.get('/api/v1/audit-events?kind=mail.given-up').expect(200);
  expect(told.body.items).toMatchObject([{ subject: 'never@people.example', facts: { tries: 1 } }]);
});

import { beforeAll, expect, test } from 'vitest';
import { testDatabase } from '../support/database.ts';
import { change, issue, newRevision, solve, versionOf } from '../support/revision-steps.ts';
import { addTeam, type Agent, openService, password, type Service, type Team } from '../support/service.ts';
import { tinyBoard } from '../support/tiny-board.ts';

const database = testDatabase();
let service: Service;
let team: Team;
let designer: Agent;
let reviewer: Agent;
let quality: Agent;
beforeAll(async () => {
  service = openService(database);
  team = await addTeam(service, database, 'Review');
  designer = await team.signIn('layout-designer');
  reviewer = await team.signIn('thermal-reviewer');
  quality = await team.signIn('quality-engineer');
});

const codes = (answer: { body: { reasons?: { code: string }[] } }) => answer.body.reasons?.map(({ code }) => code);

test('submission – without a result – is refused in words', async () => {
  const { revisionId } = await newRevision(designer);
  const answer = await change(designer, revisionId, 'submit', { reasons: [] });
  expect([answer.status, codes(answer)]).toEqual([422, ['result-missing']]);
});

test('submission – with an open stop finding – is refused', async () => {
  const board = tinyBoard();
  const { revisionId } = await newRevision(designer, {
    ...board,
    regulators: [{ ...board.regulators[0]!, at: [19, 19] }],
  });
  await solve(designer, service, revisionId);
  const answer = await change(designer, revisionId, 'submit', { reasons: [] });
  expect(codes(answer)).toContain('stop-finding');
});

test('submission – a warning – needs its reason, which is kept', async () => {
  const board = tinyBoard();
  const { revisionId } = await newRevision(designer, { ...board, conditions: board.conditions.slice(0, 1) });
  await solve(designer, service, revisionId);
  expect(codes(await change(designer, revisionId, 'submit', { reasons: [] }))).toEqual(['reason-missing']);
  const reason = { rule: 'one-condition', ref: null, condition: null, reason: 'Bench use only.' };
  const answer = await change(designer, revisionId, 'submit', { reasons: [reason] });
  expect(answer.status).toBe(200);
  expect(answer.body).toMatchObject({ state: 'in review', reasons: [reason] });
});

test('clearing – by an author – is refused, whatever their roles', async () => {
  const { revisionId } = await newRevision(designer);
  await solve(designer, service, revisionId);
  await change(designer, revisionId, 'submit', { reasons: [] });
  await database
    .knex('members')
    .where({ email: team.emailOf('layout-designer') })
    .update({ roles: ['layout-designer', 'thermal-reviewer'] });
  const answer = await change(designer, revisionId, 'clear', { password });
  await database
    .knex('members')
    .where({ email: team.emailOf('layout-designer') })
    .update({ roles: ['layout-designer'] });
  expect([answer.status, answer.body.code]).toEqual([403, 'author']);
});

test('clearing – a board over its limit – is refused; sending back mails the reason', async () => {
  const { revisionId } = await newRevision(designer, tinyBoard(1.1));
  await solve(designer, service, revisionId);
  expect((await change(designer, revisionId, 'submit', { reasons: [] })).status).toBe(200);
  expect(codes(await change(reviewer, revisionId, 'clear', { password }))).toEqual(['over-limit']);
  const back = await change(reviewer, revisionId, 'send-back', { reason: 'More copper below U1, please.' });
  expect(back.body).toMatchObject({ state: 'sent back', stateReason: 'More copper below U1, please.' });
  const mails = await database.knex('mail_outbox').where({ recipient: team.emailOf('layout-designer') });
  expect(mails.map(({ text }) => text).join()).toContain('More copper below U1, please.');
});

test('clearing – with an open comment – waits until it is resolved', async () => {
  const { revisionId } = await newRevision(designer);
  await solve(designer, service, revisionId);
  await change(designer, revisionId, 'submit', { reasons: [] });
  const comment = await quality
    .post(`/api/v1/revisions/${revisionId}/comments`)
    .send({ text: 'Which ambient?', place: { kind: 'regulator', id: 'U1' } })
    .expect(201);
  expect(codes(await change(reviewer, revisionId, 'clear', { password }))).toEqual(['comments-open']);
  await designer.post(`/api/v1/revisions/${revisionId}/comments/${comment.body.id}/resolve`).send({}).expect(200);
  expect((await change(reviewer, revisionId, 'clear', { password })).status).toBe(200);
});

test('signing – with a wrong password – changes nothing', async () => {
  const { revisionId } = await newRevision(designer);
  await solve(designer, service, revisionId);
  await change(designer, revisionId, 'submit', { reasons: [] });
  const answer = await change(reviewer, revisionId, 'clear', { password: 'not my password' });
  expect(answer.status).toBe(422);
  expect((await reviewer.get(`/api/v1/revisions/${revisionId}`)).body.state).toBe('in review');
});

test('clearing – over a version that the reviewer has not seen – is refused', async () => {
  const { revisionId } = await newRevision(designer);
  await solve(designer, service, revisionId);
  const seen = await versionOf(reviewer, revisionId);
  await change(designer, revisionId, 'submit', { reasons: [] });
  await reviewer.post(`/api/v1/revisions/${revisionId}/clear`).set('If-Match', seen).send({ password }).expect(412);
});

test('issue – three signatures – freezes the revision, also against SQL, and supersedes the earlier one', async () => {
  const { assemblyId, revisionId } = await newRevision(designer);
  await solve(designer, service, revisionId);
  await issue({ designer, reviewer, quality }, revisionId);
  const view = (await quality.get(`/api/v1/revisions/${revisionId}`)).body;
  expect(new Set(view.signatures.map(({ meaning }: { meaning: string }) => meaning))).toEqual(
    new Set(['authored', 'reviewed', 'released']),
  );
  expect(
    (
      await designer
        .put(`/api/v1/revisions/${revisionId}/sketch`)
        .set('If-Match', `"${view.version}"`)
        .send(tinyBoard(0.9))
    ).status,
  ).toBe(409);
  const { knex } = database;
  await expect(knex('revisions').where({ id: revisionId }).update({ letter: 'Z' })).rejects.toThrow(/frozen/);
  await expect(knex('sketch_versions').where({ revision_id: revisionId }).update({ board: '{}' })).rejects.toThrow(
    /frozen/,
  );
  await expect(knex('signatures').where({ revision_id: revisionId }).delete()).rejects.toThrow(/frozen/);
  const { result_id: resultId } = await knex('revisions').where({ id: revisionId }).first('result_id');
  await expect(knex('results').where({ id: resultId }).update({ verdict: 'over' })).rejects.toThrow(/frozen/);
  await expect(knex('heat_fields').where({ result_id: resultId }).delete()).rejects.toThrow(/frozen/);
  // Superseding is the one change that is left, and only that.
  await expect(
    knex('revisions').where({ id: revisionId }).update({ state: 'superseded', sketch_hash: 'other' }),
  ).rejects.toThrow(/frozen/);

  const next = await designer.post(`/api/v1/assemblies/${assemblyId}/revisions`).send({ from: revisionId }).expect(201);
  expect(next.body.letter).toBe('B');
  await solve(designer, service, next.body.id);
  await issue({ designer, reviewer, quality }, next.body.id);
  expect((await quality.get(`/api/v1/revisions/${revisionId}`)).body.state).toBe('superseded');
});

test('record – of an issued revision – is the same bytes every time', async () => {
  const { assemblyId, revisionId } = await newRevision(designer);
  await solve(designer, service, revisionId);
  await issue({ designer, reviewer, quality }, revisionId);
  const print = async () => {
    const answer = await quality
      .get(`/api/v1/revisions/${revisionId}/record.pdf?paper=letter`)
      .buffer()
      .parse((response, done) => {
        const chunks: Buffer[] = [];
        response.on('data', (chunk: Buffer) => chunks.push(chunk));
        response.on('end', () => done(null, Buffer.concat(chunks)));
      });
    expect(answer.status).toBe(200);
    return answer.body as Buffer;
  };
  const first = await print();
  // People and assemblies may be renamed later; what was signed is not.
  await database
    .knex('members')
    .where({ email: team.emailOf('layout-designer') })
    .update({ name: 'Another Name' });
  await designer.patch(`/api/v1/assemblies/${assemblyId}`).send({ title: 'Another title' }).expect(200);
  const second = await print();
  expect(first.subarray(0, 5).toString()).toBe('%PDF-');
  expect(first.equals(second)).toBe(true);
});

test('audit trail – after all of that – tells it in order and takes no change', async () => {
  const answer = await quality.get('/api/v1/audit-events?limit=200').expect(200);
  const sequence = answer.body.items.map((event: { sequence: number }) => event.sequence);
  expect(sequence).toEqual([...sequence].sort((a: number, b: number) => b - a));
  await expect(database.knex('audit_events').delete()).rejects.toThrow(/append-only/);
  await expect(database.knex.raw('truncate audit_events')).rejects.toThrow(/append-only/);
  await expect(database.knex('audit_events').update({ kind: 'sketch.saved' })).rejects.toThrow(/append-only/);
});

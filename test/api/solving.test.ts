import { execFileSync } from 'node:child_process';
import { join } from 'node:path';
import { beforeAll, expect, test } from 'vitest';
import { readBoard } from '#core/board/read-board.ts';
import { checkBoard } from '#core/check/check-board.ts';
import { testDatabase } from '../support/database.ts';
import { newRevision, solve } from '../support/revision-steps.ts';
import { addTeam, type Agent, openService, type Service } from '../support/service.ts';
import { tinyBoard } from '../support/tiny-board.ts';

const database = testDatabase();
let service: Service;
let designer: Agent;
beforeAll(async () => {
  service = openService(database);
  designer = await (await addTeam(service, database, 'Solving')).signIn('layout-designer');
});

test('check – of a new sketch – is queued, done in a thread, and stored with its heat', async () => {
  const { revisionId } = await newRevision(designer, tinyBoard(0.21));
  const queued = await designer.post(`/api/v1/revisions/${revisionId}/solve`).send({}).expect(202);
  expect(queued.body).toMatchObject({ state: 'waiting', total: 2 });
  expect((await designer.get(`/api/v1/revisions/${revisionId}/result`)).body).toBeNull();
  await service.runJobs();
  const job = await designer.get(`/api/v1/revisions/${revisionId}/jobs/${queued.body.id}`);
  expect(job.body).toMatchObject({ state: 'done', done: 2, total: 2 });
  const stored = (await designer.get(`/api/v1/revisions/${revisionId}/result`)).body;
  expect(stored).toMatchObject({ upToDate: true, sketchVersion: 1, result: { verdict: 'within' } });
  const field = await designer.get(`/api/v1/revisions/${revisionId}/result/field?condition=Room`).expect(200);
  const cells = Buffer.from(field.body.layers[0].temperatureC, 'base64');
  expect(cells.length).toBe(field.body.columns * field.body.rows * 4);
  const hottest = Math.max(...Array.from({ length: cells.length / 4 }, (_, index) => cells.readFloatLE(index * 4)));
  expect(hottest).toBeLessThan(stored.result.conditions[0].regulators[0].junctionC);
  expect(hottest).toBeGreaterThan(25);
});

test('check – of content that has a result already – is done at once', async () => {
  const { revisionId } = await newRevision(designer, tinyBoard(0.21));
  const answer = await designer.post(`/api/v1/revisions/${revisionId}/solve`).send({}).expect(202);
  expect(answer.body.state).toBe('done');
  expect(service.queued).toEqual([]);
});

test('result – after another save – is of an earlier sketch', async () => {
  const { revisionId } = await newRevision(designer, tinyBoard(0.22));
  await solve(designer, service, revisionId);
  await designer.put(`/api/v1/revisions/${revisionId}/sketch`).set('If-Match', '"1"').send(tinyBoard(0.23)).expect(200);
  expect((await designer.get(`/api/v1/revisions/${revisionId}/result`)).body.upToDate).toBe(false);
});

test('check – cancelled while it waits – is never done', async () => {
  const { revisionId } = await newRevision(designer, tinyBoard(0.24));
  const job = await designer.post(`/api/v1/revisions/${revisionId}/solve`).send({}).expect(202);
  await designer.delete(`/api/v1/revisions/${revisionId}/jobs/${job.body.id}`).expect(204);
  await service.runJobs();
  expect((await designer.get(`/api/v1/revisions/${revisionId}/jobs/${job.body.id}`)).body.state).toBe('cancelled');
  expect((await designer.get(`/api/v1/revisions/${revisionId}/result`)).body).toBeNull();
});

test('one board – by the core, the server’s thread and the command line – has one result to the last digit', async () => {
  const document = tinyBoard(0.25);
  const { revisionId } = await newRevision(designer, document);
  await solve(designer, service, revisionId);
  const stored = (await designer.get(`/api/v1/revisions/${revisionId}/result`)).body.result;
  const reading = readBoard(document);
  if (!reading.ok) throw new Error('the test board is not valid');
  const own = JSON.parse(JSON.stringify(checkBoard(reading.board, reading.assumptions).result));
  const command = join(import.meta.dirname, '../../api/command/dropwatt.js');
  const printed = JSON.parse(
    execFileSync(process.execPath, [command, 'check', '-'], { input: JSON.stringify(document), encoding: 'utf8' }),
  );
  // Only the time that it took may differ.
  for (const result of [stored, own, printed]) for (const { solver } of result.conditions) solver.milliseconds = 0;
  expect(stored).toEqual(own);
  expect(printed).toEqual(own);
});

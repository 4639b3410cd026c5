import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { performJob } from '#api/solving/perform-job.ts';
import { openCheckQueue, type RunningQueue } from '#api/solving/check-queue.ts';
import { claimJob, endJob, releaseSilentJobs } from '#db/solve-jobs.ts';
import { testDatabase } from '../support/database.ts';
import { newRevision } from '../support/revision-steps.ts';
import { addTeam, type Agent, logger, openService } from '../support/service.ts';
import { tinyBoard } from '../support/tiny-board.ts';

const database = testDatabase();
let queue: RunningQueue;
let designer: Agent;
beforeAll(async () => {
  queue = await openCheckQueue(database.url, logger, true);
  designer = await (await addTeam(openService(database), database, 'Queue')).signIn('layout-designer');
});
afterAll(() => queue.stop());

const thread = new URL('../../api/solving/check-thread.js', import.meta.url);
const worker = (limits = { seconds: 120, megabytes: 1024 }) => ({
  database: database.knex,
  logger,
  newId: randomUUID,
  thread,
  limits,
});

async function waitingJob(powerW: number): Promise<string> {
  const { revisionId } = await newRevision(designer, tinyBoard(powerW));
  const answer = await designer.post(`/api/v1/revisions/${revisionId}/solve`).send({}).expect(202);
  return answer.body.id;
}
const jobRow = (id: string) => database.knex('solve_jobs').where({ id }).first();
const fallSilent = (id: string) =>
  database
    .knex('solve_jobs')
    .where({ id })
    .update({ lease_until: database.knex.raw("now() - interval '1 s'") });

test('queue – a message in a transaction – comes when it is committed, and never when it is rolled back', async () => {
  const { knex } = database;
  const rolledBack = randomUUID();
  const committed = randomUUID();
  await expect(
    knex.transaction(async (trx) => {
      await queue.send(trx, rolledBack);
      throw new Error('changed my mind');
    }),
  ).rejects.toThrow('changed my mind');
  await knex.transaction((trx) => queue.send(trx, committed));
  const seen: string[] = [];
  await new Promise<void>((done) => {
    void queue.work(1, async (jobId) => {
      seen.push(jobId);
      if (jobId === committed) done();
    });
  });
  expect(seen).toEqual([committed]);
});

test('job – its worker killed – goes to another one and ends exactly once', async () => {
  const id = await waitingJob(0.31);
  const dead = await claimJob(database.knex, id);
  expect(dead).toMatchObject({ state: 'running', attempts: 1 });
  // While the lease runs nobody else gets it.
  expect(await claimJob(database.knex, id)).toBeNull();
  expect((await releaseSilentJobs(database.knex, 3)).waiting).toEqual([]);
  await fallSilent(id);
  expect((await releaseSilentJobs(database.knex, 3)).waiting.map((job) => job.id)).toEqual([id]);
  await performJob(worker(), id);
  expect(await jobRow(id)).toMatchObject({ state: 'done', attempts: 2, done: 2, total: 2 });
  // The first worker was only slow: its end comes too late and changes nothing.
  expect(await endJob(database.knex, dead!, { state: 'failed', message: 'late' })).toBe(false);
  expect(await jobRow(id)).toMatchObject({ state: 'done', message: null });
  const { input_hash: inputHash } = await jobRow(id);
  expect(await database.knex('results').where({ input_hash: inputHash })).toHaveLength(1);
});

test('job – two workers at once – is done by one', async () => {
  const id = await waitingJob(0.32);
  await Promise.all([performJob(worker(), id), performJob(worker(), id)]);
  expect(await jobRow(id)).toMatchObject({ state: 'done', attempts: 1 });
});

test('job – whose worker dies three times – fails with a reason', async () => {
  const id = await waitingJob(0.33);
  for (let attempt = 1; attempt <= 3; attempt++) {
    expect((await claimJob(database.knex, id))?.attempts).toBe(attempt);
    await fallSilent(id);
    await releaseSilentJobs(database.knex, 3);
  }
  expect(await jobRow(id)).toMatchObject({ state: 'failed', message: expect.stringContaining('3 times') });
});

test('job – over its time – is ended with a reason', async () => {
  const id = await waitingJob(0.34);
  await performJob(worker({ seconds: 0.001, megabytes: 1024 }), id);
  expect(await jobRow(id)).toMatchObject({ state: 'failed', message: expect.stringContaining('longer than') });
});

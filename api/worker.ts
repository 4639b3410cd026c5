import { randomUUID } from 'node:crypto';
import { existsSync } from 'node:fs';
import nodemailer from 'nodemailer';
import { pino } from 'pino';
import { removeOldAttempts } from '#db/attempt-counters.ts';
import { openDatabase } from '#db/connection.ts';
import { removeOldKeys } from '#db/idempotency-keys.ts';
import { removeOldResets } from '#db/password-resets.ts';
import { removeOldSessions } from '#db/sessions.ts';
import { releaseSilentJobs } from '#db/solve-jobs.ts';
import { transaction } from '#db/transaction.ts';
import { beat, removeDeadHeartbeats, removeHeartbeat } from '#db/worker-heartbeats.ts';
import { environmentOrExit } from './env.ts';
import { sendWaitingMails } from './mail/send-waiting-mails.ts';
import { orEnd } from './or-end.ts';
import { repeat } from './repeat.ts';
import { openCheckQueue } from './solving/check-queue.ts';
import { performJob } from './solving/perform-job.ts';
import { whenAsked } from './when-asked.ts';

/** Checks, mails and housekeeping; any number of these processes share one database. */
const environment = environmentOrExit(process.env);
const logger = pino({ level: environment.LOG_LEVEL });
const database = openDatabase(environment.DATABASE_URL, 6);
const queue = await orEnd(
  'DATABASE_URL leads to no usable database',
  openCheckQueue(environment.DATABASE_URL, logger, true),
);
const transport = nodemailer.createTransport({
  url: environment.SMTP_URL,
  connectionTimeout: 10_000,
  greetingTimeout: 10_000,
  socketTimeout: 20_000,
});
const workerId = randomUUID();
const built = new URL('./check-thread.js', import.meta.url);
const jobs = {
  database,
  logger,
  newId: randomUUID,
  thread: existsSync(built) ? built : new URL('./solving/check-thread.js', import.meta.url),
  limits: { seconds: 600, megabytes: 2048 },
};
const mostAttempts = 3;

await beat(database, workerId);
await queue.work(environment.WORKER_CONCURRENCY, (jobId) => performJob(jobs, jobId));

const repeated = [
  repeat('heartbeat', 3000, logger, () => beat(database, workerId)),
  repeat('mail', 700, logger, () => sendWaitingMails(database, transport, environment.MAIL_FROM, logger)),
  repeat('silent jobs', 5000, logger, () =>
    transaction(database, async (trx) => {
      const { waiting } = await releaseSilentJobs(trx, mostAttempts);
      for (const job of waiting) await queue.send(trx, job.id);
    }),
  ),
  repeat('housekeeping', 3_600_000, logger, async () => {
    await removeOldAttempts(database);
    await removeOldKeys(database);
    await removeOldResets(database);
    await removeOldSessions(database);
    await removeDeadHeartbeats(database);
  }),
];

whenAsked(async () => {
  await Promise.all(repeated.map((stop) => stop()));
  await queue.stop();
  transport.close();
  await removeHeartbeat(database, workerId);
  await database.destroy();
});

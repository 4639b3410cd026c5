import PgBoss from 'pg-boss';
import type { Knex } from 'knex';
import type { Logger } from 'pino';

const queueName = 'check';
/** Deliveries of one message; the job's own row decides whether there is anything left to do. */
const retry = { retryLimit: 3, retryDelay: 2, retryBackoff: true, expireInSeconds: 1800 };

/** Tells workers of jobs that wait; the message is part of the transaction that stored the job. */
export type CheckQueue = { send: (trx: Knex.Transaction, jobId: string) => Promise<void> };

export type RunningQueue = CheckQueue & {
  /** Hands jobs to `handle`, `concurrency` at a time. */
  work: (concurrency: number, handle: (jobId: string) => Promise<void>) => Promise<void>;
  /** Waits for what is being handled, at most `timeoutMs`. */
  stop: (timeoutMs?: number) => Promise<void>;
};

type Connection = { query: (text: string, values: unknown[]) => Promise<{ rows: unknown[] }> };

/**
 * Opens the queue in the database itself.
 * @param keepsHouse the worker's instance removes old messages; the API's only sends
 */
export async function openCheckQueue(url: string, logger: Logger, keepsHouse: boolean): Promise<RunningQueue> {
  const boss = new PgBoss({
    connectionString: url,
    application_name: 'dropwatt-queue',
    max: keepsHouse ? 4 : 2,
    supervise: keepsHouse,
    schedule: false,
  });
  boss.on('error', (error) => logger.warn({ err: error }, 'queue'));
  await boss.start();
  await boss.createQueue(queueName, { name: queueName, ...retry });
  return {
    send: async (trx, jobId) => {
      await boss.send(queueName, { jobId }, { ...retry, db: { executeSql: withinTransaction(trx) } });
    },
    work: async (concurrency, handle) => {
      for (let index = 0; index < concurrency; index++)
        await boss.work<{ jobId: string }>(
          queueName,
          { batchSize: 1, pollingIntervalSeconds: 0.5 },
          async (messages) => {
            for (const { data } of messages) await handle(data.jobId);
          },
        );
    },
    stop: async (timeoutMs = 8000) => {
      await boss.stop({ graceful: true, wait: true, timeout: timeoutMs });
    },
  };
}

function withinTransaction(trx: Knex.Transaction) {
  return async (text: string, values: unknown[]) => {
    const client = trx.client as { acquireConnection: () => Promise<Connection> };
    return (await client.acquireConnection()).query(text, values);
  };
}

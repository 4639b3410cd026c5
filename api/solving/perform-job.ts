import type { Logger } from 'pino';
import type { Database } from '#db/database.ts';
import { insertHeatFields } from '#db/heat-fields.ts';
import { insertResult } from '#db/results.ts';
import { claimJob, endJob, renewLease, type SolveJob } from '#db/solve-jobs.ts';
import { findSketchVersion } from '#db/sketch-versions.ts';
import { transaction } from '#db/transaction.ts';
import { type CheckLimits, runCheck } from './run-check.ts';

export type JobDeps = { database: Database; logger: Logger; newId: () => string; thread: URL; limits: CheckLimits };

const signOfLifeMs = 2000;

/** Does a waiting job; nothing when it has ended or somebody else has it. The result is stored once, with the job's end. */
export async function performJob(deps: JobDeps, jobId: string): Promise<void> {
  const { database, logger } = deps;
  const job = await claimJob(database, jobId);
  if (!job) return;
  const sketch = await findSketchVersion(database, job.revisionId, job.sketchVersion);
  if (!sketch) throw new Error(`job ${job.id} has no sketch`);
  const control = new AbortController();
  let progress = { done: 0, total: job.total };
  const alive = async () => {
    // No longer ours: it was cancelled, or given to another worker after a long silence.
    if (!(await renewLease(database, job, progress))) control.abort();
  };
  const sayAlive = () => void alive().catch((error: unknown) => logger.warn({ err: error, jobId }, 'lease'));
  const timer = setInterval(sayAlive, signOfLifeMs);
  try {
    const end = await runCheck(
      deps.thread,
      sketch.board,
      deps.limits,
      (done, total) => {
        progress = { done, total };
        sayAlive();
      },
      control.signal,
    );
    if (end.kind === 'ended') return;
    if (end.kind === 'refused') await endJob(database, job, { state: 'failed', message: end.message });
    else await storeResult(deps, job, end);
  } finally {
    clearInterval(timer);
  }
}

type Done = Extract<Awaited<ReturnType<typeof runCheck>>, { kind: 'result' }>;

async function storeResult({ database, newId }: JobDeps, job: SolveJob, { result, fields }: Done): Promise<void> {
  await transaction(database, async (trx) => {
    if (!(await endJob(trx, job, { state: 'done', message: null }))) return;
    const { inputHash, method, teamId } = job;
    const id = await insertResult(trx, { id: newId(), teamId, inputHash, method, verdict: result.verdict, result });
    if (id) await insertHeatFields(trx, id, fields);
  });
}

import type { Database } from './database.ts';

export type SolveJobState = 'waiting' | 'running' | 'done' | 'failed' | 'cancelled';

export type SolveJob = {
  id: string;
  teamId: string;
  revisionId: string;
  sketchVersion: number;
  inputHash: string;
  method: string;
  state: SolveJobState;
  /** Conditions done and in all. */
  done: number;
  total: number;
  message: string | null;
  attempts: number;
};

type Row = {
  id: string;
  team_id: string;
  revision_id: string;
  sketch_version: number;
  input_hash: string;
  method: string;
  state: SolveJobState;
  done: number;
  total: number;
  message: string | null;
  attempts: number;
};

const job = (row: Row): SolveJob => ({
  id: row.id,
  teamId: row.team_id,
  revisionId: row.revision_id,
  sketchVersion: row.sketch_version,
  inputHash: row.input_hash,
  method: row.method,
  state: row.state,
  done: row.done,
  total: row.total,
  message: row.message,
  attempts: row.attempts,
});

/** Inserts a job; null when an open one for the same input and method is there already. */
export async function insertJob(
  database: Database,
  given: Omit<SolveJob, 'message' | 'attempts' | 'done'> & { requestedBy: string },
): Promise<SolveJob | null> {
  const rows = await database('solve_jobs')
    .insert({
      id: given.id,
      team_id: given.teamId,
      revision_id: given.revisionId,
      sketch_version: given.sketchVersion,
      input_hash: given.inputHash,
      method: given.method,
      state: given.state,
      total: given.total,
      done: given.state === 'done' ? given.total : 0,
      ended_at: given.state === 'done' ? database.fn.now() : null,
      lease_until: given.state === 'done' ? null : leaseEnd(database, waitingSeconds),
      requested_by: given.requestedBy,
    })
    .onConflict(database.raw("(revision_id, input_hash, method) where state in ('waiting', 'running')"))
    .ignore()
    .returning<Row[]>('*');
  return rows[0] ? job(rows[0]) : null;
}

export async function findJob(database: Database, revisionId: string, id: string): Promise<SolveJob | null> {
  const row = await database('solve_jobs').where({ revision_id: revisionId, id }).first<Row | undefined>('*');
  return row ? job(row) : null;
}

export async function findOpenJob(
  database: Database,
  revisionId: string,
  inputHash: string,
  method: string,
): Promise<SolveJob | null> {
  const row = await database('solve_jobs')
    .where({ revision_id: revisionId, input_hash: inputHash, method })
    .whereIn('state', ['waiting', 'running'])
    .first<Row | undefined>('*');
  return row ? job(row) : null;
}

/** Seconds that a worker may be silent before its job goes to another one. */
export const leaseSeconds = 15;
/** Seconds that a job may wait before the queue is told about it once more. */
const waitingSeconds = 60;

/** Takes a waiting job; null when another worker has it, or it has ended. */
export async function claimJob(database: Database, id: string): Promise<SolveJob | null> {
  const rows = await database('solve_jobs')
    .where({ id, state: 'waiting' })
    .update({
      state: 'running',
      done: 0,
      attempts: database.raw('attempts + 1'),
      lease_until: leaseEnd(database, leaseSeconds),
    })
    .returning<Row[]>('*');
  return rows[0] ? job(rows[0]) : null;
}

/** Sign of life with progress; false when the job is no longer this attempt's (cancelled, or given to another worker). */
export async function renewLease(
  database: Database,
  { id, attempts }: Pick<SolveJob, 'id' | 'attempts'>,
  progress: { done: number; total: number },
): Promise<boolean> {
  const count = await database('solve_jobs')
    .where({ id, state: 'running', attempts })
    .update({ ...progress, lease_until: leaseEnd(database, leaseSeconds) });
  return count === 1;
}

/** Ends a running job once; false when it had already ended or been given away. */
export async function endJob(
  database: Database,
  { id, attempts }: Pick<SolveJob, 'id' | 'attempts'>,
  end: { state: 'done' | 'failed'; message: string | null },
): Promise<boolean> {
  const count = await database('solve_jobs')
    .where({ id, state: 'running', attempts })
    .update({
      ...end,
      ended_at: database.fn.now(),
      lease_until: null,
      ...(end.state === 'done' ? { done: database.ref('total') } : {}),
    });
  return count === 1;
}

export async function cancelJob(database: Database, id: string): Promise<boolean> {
  const count = await database('solve_jobs')
    .where({ id })
    .whereIn('state', ['waiting', 'running'])
    .update({ state: 'cancelled', ended_at: database.fn.now(), lease_until: null });
  return count === 1;
}

/** Jobs whose worker fell silent or whose message was lost: waiting again, or failed after `attempts` tries. */
export async function releaseSilentJobs(
  database: Database,
  attempts: number,
): Promise<{ waiting: SolveJob[]; failed: SolveJob[] }> {
  const silent = (query: ReturnType<Database>) => query.whereRaw('lease_until < now()');
  const failed = await silent(database('solve_jobs').where({ state: 'running' }).where('attempts', '>=', attempts))
    .update({
      state: 'failed',
      message: `The check ended its worker ${attempts} times and was given up.`,
      ended_at: database.fn.now(),
      lease_until: null,
    })
    .returning<Row[]>('*');
  const waiting = await silent(database('solve_jobs').whereIn('state', ['waiting', 'running']))
    .update({ state: 'waiting', lease_until: leaseEnd(database, waitingSeconds) })
    .returning<Row[]>('*');
  return { waiting: waiting.map(job), failed: failed.map(job) };
}

function leaseEnd(database: Database, seconds: number) {
  return database.raw('now() + make_interval(secs => ?)', [seconds]);
}

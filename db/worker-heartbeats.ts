import type { Database } from './database.ts';

/** A worker is taken for alive when it was seen within this time. */
const aliveSeconds = 15;

export async function beat(database: Database, workerId: string): Promise<void> {
  await database('worker_heartbeats')
    .insert({ worker_id: workerId })
    .onConflict('worker_id')
    .merge({ seen_at: database.fn.now() });
}

export async function removeHeartbeat(database: Database, workerId: string): Promise<void> {
  await database('worker_heartbeats').where({ worker_id: workerId }).delete();
}

export async function removeDeadHeartbeats(database: Database): Promise<void> {
  await database('worker_heartbeats').whereRaw("seen_at < now() - interval '1 day'").delete();
}

export async function anyWorkerAlive(database: Database): Promise<boolean> {
  const row: unknown = await database('worker_heartbeats')
    .whereRaw('seen_at > now() - make_interval(secs => ?)', [aliveSeconds])
    .first('worker_id');
  return row !== undefined;
}

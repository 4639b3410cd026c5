import { type Database, only } from './database.ts';

export type AttemptLimit = { attempts: number; windowSeconds: number };

/**
 * Counts one attempt under a key, in a window that starts with the first one; shared by every process.
 * @returns seconds to wait when there have been too many, otherwise 0
 */
export async function countAttempt(database: Database, key: string, limit: AttemptLimit): Promise<number> {
  const { rows } = await database.raw<{ rows: { count: number; left: number }[] }>(
    `insert into attempt_counters as c (key, count) values (:key, 1)
     on conflict (key) do update set
       count = case when c.window_started_at <= now() - make_interval(secs => :seconds) then 1 else c.count + 1 end,
       window_started_at =
         case when c.window_started_at <= now() - make_interval(secs => :seconds) then now() else c.window_started_at end
     returning count,
       ceil(extract(epoch from window_started_at + make_interval(secs => :seconds) - now()))::int as left`,
    { key, seconds: limit.windowSeconds },
  );
  const { count, left } = only(rows);
  return count > limit.attempts ? Math.max(left, 1) : 0;
}

/** Takes an attempt back that turned out well. */
export async function forgiveAttempt(database: Database, key: string): Promise<void> {
  await database('attempt_counters').where({ key }).where('count', '>', 0).decrement('count', 1);
}

/** Forgets every attempt under a key. */
export async function clearAttempts(database: Database, key: string): Promise<void> {
  await database('attempt_counters').where({ key }).delete();
}

export async function removeOldAttempts(database: Database): Promise<void> {
  await database('attempt_counters').whereRaw("window_started_at < now() - interval '1 day'").delete();
}

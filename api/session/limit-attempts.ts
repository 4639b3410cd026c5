import { type AttemptLimit, countAttempt } from '#db/attempt-counters.ts';
import type { Database } from '#db/database.ts';
import { Refusal } from '../http/refusal.ts';

export const perAccount: AttemptLimit = { attempts: 10, windowSeconds: 900 };
export const perAddress: AttemptLimit = { attempts: 100, windowSeconds: 900 };

/**
 * Counts an attempt under every key before any work is done for it.
 * @throws Refusal 429 with the time to wait
 */
export async function limitAttempts(
  database: Database,
  keys: readonly { key: string; limit: AttemptLimit }[],
): Promise<void> {
  const waits = await Promise.all(keys.map(({ key, limit }) => countAttempt(database, key, limit)));
  const seconds = Math.max(...waits);
  if (seconds > 0)
    throw new Refusal(
      429,
      'too-many-attempts',
      'Too many attempts',
      `Try again in ${Math.ceil(seconds / 60)} minute(s).`,
      { retryAfterSeconds: seconds },
    );
}

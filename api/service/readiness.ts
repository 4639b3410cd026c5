import { migrationsComplete } from '#db/migration-state.ts';
import { anyWorkerAlive } from '#db/worker-heartbeats.ts';
import type { Deps } from '../deps.ts';

/** Longest time that a check may take before its part counts as not there. */
const patienceMs = 2500;

/** Whether the database answers, holds exactly our migrations, and a worker was seen lately. */
export async function readiness({ database, migrationsFolder, logger }: Deps) {
  const [answers, migrations, worker] = await Promise.all([
    holds(async () => Boolean(await database.raw('select 1'))),
    holds(() => migrationsComplete(database, migrationsFolder)),
    holds(() => anyWorkerAlive(database)),
  ]);
  const ready = answers && migrations && worker;
  if (!ready) logger.warn({ database: answers, migrations, worker }, 'not ready');
  return { status: ready ? 'ready' : 'not ready', database: answers, migrations, worker } as const;
}

async function holds(check: () => Promise<boolean>): Promise<boolean> {
  let timer: NodeJS.Timeout | undefined;
  const late = new Promise<boolean>((resolve) => {
    timer = setTimeout(() => resolve(false), patienceMs);
  });
  try {
    return await Promise.race([check(), late]);
  } catch {
    return false;
  } finally {
    clearTimeout(timer);
  }
}

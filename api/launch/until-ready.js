import { setTimeout as pause } from 'node:timers/promises';

const patienceMs = 60_000;

/**
 * Waits until an address answers 200, or until the start is told to end.
 * @throws Error when it does not within a minute
 */
export async function untilReady(url, ending) {
  for (const began = Date.now(); Date.now() - began < patienceMs && !ending.aborted; await pause(100)) {
    try {
      if ((await fetch(url)).status === 200) return;
    } catch {
      // Not listening yet.
    }
  }
  if (!ending.aborted) throw new Error(`The service did not become ready within ${patienceMs / 1000} s.`);
}

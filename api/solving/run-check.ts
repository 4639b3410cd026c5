import { Worker } from 'node:worker_threads';
import type { BoardDocument } from '#core/board/document.ts';
import type { CheckResult } from '#core/result/result.ts';
import type { ThreadMessage } from './check-thread.ts';

export type CheckEnd =
  | { kind: 'result'; result: CheckResult; fields: ReadonlyMap<string, Uint8Array> }
  | { kind: 'refused'; message: string }
  | { kind: 'ended' };

export type CheckLimits = { seconds: number; megabytes: number };

/**
 * Runs one check in a thread, within limits of time and memory.
 * @param thread address of the thread's program
 * @param signal ends the thread; the check then answers `ended`
 */
export function runCheck(
  thread: URL,
  document: BoardDocument,
  limits: CheckLimits,
  onProgress: (done: number, total: number) => void,
  signal: AbortSignal,
): Promise<CheckEnd> {
  return new Promise((answer) => {
    const worker = new Worker(thread, {
      workerData: { document },
      resourceLimits: { maxOldGenerationSizeMb: limits.megabytes },
    });
    const timer = setTimeout(
      () => finish({ kind: 'refused', message: `The check took longer than ${limits.seconds} s and was ended.` }),
      limits.seconds * 1000,
    );
    const finish = (end: CheckEnd) => {
      clearTimeout(timer);
      signal.removeEventListener('abort', abort);
      answer(end);
      void worker.terminate();
    };
    const abort = () => finish({ kind: 'ended' });
    if (signal.aborted) return abort();
    signal.addEventListener('abort', abort);
    worker.on('message', (message: ThreadMessage) => {
      if (message.kind === 'progress') onProgress(message.done, message.total);
      else finish(message);
    });
    worker.on('error', (error) => {
      const isMemory = (error as NodeJS.ErrnoException).code === 'ERR_WORKER_OUT_OF_MEMORY';
      const reason = isMemory ? `needs more than ${limits.megabytes} MB of memory` : `failed: ${error.message}`;
      finish({ kind: 'refused', message: `The check ${reason}.` });
    });
    worker.on('exit', () => finish({ kind: 'refused', message: 'The check ended without a result.' }));
  });
}

import { parentPort, workerData } from 'node:worker_threads';
import type { BoardDocument } from '#core/board/document.ts';
import { readBoard } from '#core/board/read-board.ts';
import { checkBoard } from '#core/check/check-board.ts';
import { type CheckResult, checkResult } from '#core/result/result.ts';
import { packHeatField } from './heat-field-pack.ts';

/** What the thread tells: progress after every condition, then the result or why there is none. */
export type ThreadMessage =
  | { kind: 'progress'; done: number; total: number }
  | { kind: 'result'; result: CheckResult; fields: Map<string, Uint8Array> }
  | { kind: 'refused'; message: string };

const tell = (message: ThreadMessage) => parentPort?.postMessage(message);

/** One check in a thread of its own: it can be ended at any time, and its memory is capped. */
function run(document: BoardDocument): void {
  const reading = readBoard(document);
  if (!reading.ok) {
    const [fault] = reading.faults;
    return tell({ kind: 'refused', message: `The sketch cannot be read: ${fault?.path} ${fault?.message}` });
  }
  try {
    const { result, fields } = checkBoard(reading.board, reading.assumptions, {
      now: () => performance.now(),
      onProgress: (done, total) => {
        tell({ kind: 'progress', done, total });
        return true;
      },
    });
    // JSON has no NaN: one would be stored as null, silently. The schema takes finite numbers only.
    const checked = checkResult.safeParse(result);
    if (!checked.success) {
      const [issue] = checked.error.issues;
      return tell({ kind: 'refused', message: `The check gave no number at ${issue?.path.join('.')}.` });
    }
    const packed = new Map([...fields].map(([condition, field]) => [condition, packHeatField(field)]));
    tell({ kind: 'result', result, fields: packed });
  } catch (error) {
    if (!(error instanceof Error && error.name === 'BoardTooLarge')) throw error;
    tell({ kind: 'refused', message: error.message });
  }
}

run((workerData as { document: BoardDocument }).document);

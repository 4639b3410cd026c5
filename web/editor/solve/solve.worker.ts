import * as Comlink from 'comlink';
import type { Board } from '#core/board/document.ts';
import { checkBoard } from '#core/check/check-board.ts';
import type { CheckResult } from '#core/result/result.ts';
import type { HeatField } from '#core/thermal/heat-field.ts';

export type SolveAnswer = { result: CheckResult; field: HeatField | null };

/** The calculation beside the page: one condition of a board, with the given cell or the one that the board asks for. */
export type SolveWorker = { solve: (board: Board, condition: string, cellMm: number | null) => SolveAnswer };

const worker: SolveWorker = {
  solve(board, condition, cellMm) {
    const { result, fields } = checkBoard(board, [], {
      conditions: [condition],
      now: () => performance.now(),
      ...(cellMm !== null && { cellMm }),
    });
    const field = fields.get(condition) ?? null;
    const arrays = field
      ? [field.xEdgesMm.buffer, field.yEdgesMm.buffer, ...field.layers.map((layer) => layer.temperatureC.buffer)]
      : [];
    // A buffer may be listed once only, however many arrays look into it.
    return Comlink.transfer({ result, field }, [...new Set(arrays)]);
  },
};

Comlink.expose(worker);

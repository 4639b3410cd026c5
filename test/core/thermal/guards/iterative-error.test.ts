import { expect, test } from 'vitest';
import type { Condition } from '#core/board/condition.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { linearTolerance } from '#core/thermal/method.ts';
import { rightSide, solveLinear, solveRises } from '#core/thermal/solve-rises.ts';
import { hardBoard } from './hard-board.ts';
import { heatOf } from './solved-board.ts';

// A residual alone is no estimate of the error: what counts is how far the junctions still move.
test.each<[string, Partial<Condition>]>([
  ['still air', {}],
  ['a film of 1 W/(m²·K), which hardly holds the board', { filmWPerM2K: 1 }],
  ['moving air', { air: { kind: 'moving', speedMPerS: 2, towardDeg: 90 } }],
])('%s – solved again a hundred times as tightly – no junction moves by 0.01 K', (_, change) => {
  const board = hardBoard();
  const model = buildBoardModel(board, { cellMm: 0.5 });
  const heat = heatOf(board, { U1: 0.9, U2: 0.3, Q1: 0.25 });
  const { films, rise, ambientK, status } = solveRises(model, { ...board.conditions[0]!, ...change }, heat);
  expect(status).toBe('converged');
  const again = rise.slice();
  const record = solveLinear(model, films, rightSide(model, heat, ambientK), again, {
    tolerance: linearTolerance / 100,
  });
  expect(record.status).toBe('converged');
  for (const { junction } of model.packages) expect(Math.abs(again[junction]! - rise[junction]!)).toBeLessThan(0.01);
});

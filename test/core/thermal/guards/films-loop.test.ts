import { expect, test } from 'vitest';
import type { Condition } from '#core/board/condition.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { maximumFilmRounds } from '#core/thermal/method.ts';
import { solveRises } from '#core/thermal/solve-rises.ts';
import { hardBoard } from './hard-board.ts';
import { heatOf, solved } from './solved-board.ts';

const powers = { U1: 0.9, U2: 0.3, Q1: 0.25 };

test.each<[string, Partial<Condition>]>([
  ['still air, lying', {}],
  ['still air, upright', { orientation: 'vertical' }],
  ['moving air', { air: { kind: 'moving', speedMPerS: 1, towardDeg: 0 } }],
])('%s – films taken once more from the answer – move no junction by 0.01 K', (_, change) => {
  const board = hardBoard();
  const model = buildBoardModel(board, { cellMm: 1 });
  const condition = { ...board.conditions[0]!, ...change };
  const first = solveRises(model, condition, heatOf(board, powers));
  expect(first.status).toBe('converged');
  // A warm start begins with the films of its own answer.
  const again = solveRises(model, condition, heatOf(board, powers), first);
  for (const { junction } of model.packages) {
    expect(Math.abs(again.rise[junction]! - first.rise[junction]!)).toBeLessThan(0.01);
  }
});

test('two far starts – the solution – is one', () => {
  const board = hardBoard();
  const model = buildBoardModel(board, { cellMm: 1 });
  const [condition] = board.conditions;
  const cold = solveRises(model, condition!, heatOf(board, powers));
  const hot = solveRises(model, condition!, heatOf(board, { U1: 20, U2: 9, Q1: 5 }));
  const from = solveRises(model, condition!, heatOf(board, powers), hot);
  for (const { junction } of model.packages) {
    expect(Math.abs(from.rise[junction]! - cold.rise[junction]!)).toBeLessThan(0.01);
  }
});

test.each([
  ['40 W in one part', { U1: 40, U2: 0, Q1: 0 }],
  ['15 W on 6.4 cm²', { U1: 7, U2: 7, Q1: 1 }],
])('%s, where radiation outruns plain repetition – the films – settle all the same', (_, powers) => {
  for (const air of [{ kind: 'still' as const }, { kind: 'moving' as const, speedMPerS: 0.4, towardDeg: 205 }]) {
    const solution = solved(hardBoard(), powers, { air });
    expect(solution.status).toBe('converged');
    expect(solution.energy.imbalance).toBeLessThan(1e-6);
    expect(solution.notices.map(({ code }) => code)).toContain('rise-range');
  }
});

test('heat far beyond any part – rounds end – with a record and no number that is not one', () => {
  const solution = solved(hardBoard(), { U1: 500, U2: 500, Q1: 500 });
  expect(['converged', 'not-converged']).toContain(solution.status);
  if (solution.status === 'not-converged') expect(solution.message).toContain(String(maximumFilmRounds));
  expect(Number.isFinite(solution.board.maxC)).toBe(true);
  expect(solution.notices.map(({ code }) => code)).toContain('rise-range');
});

import { expect, test } from 'vitest';
import type { Condition } from '#core/board/condition.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { energyBalance } from '#core/thermal/energy-balance.ts';
import { solveRises } from '#core/thermal/solve-rises.ts';
import { hardBoard } from './hard-board.ts';
import { heatOf, solved } from './solved-board.ts';

const powers = { U1: 0.9, U2: 0.3, Q1: 0.25 };
const airs: [string, Partial<Condition>][] = [
  ['still air, lying', {}],
  ['still air, upright at 3000 m', { orientation: 'vertical', altitudeM: 3000 }],
  ['a fixed film, another one below', { filmWPerM2K: { top: 25, bottom: 4 } }],
  ['moving air along x', { air: { kind: 'moving', speedMPerS: 1.5, towardDeg: 0 } }],
  ['moving air askew', { air: { kind: 'moving', speedMPerS: 0.6, towardDeg: 130 } }],
  ['cold and in a warm box', { ambientC: -40, boxRiseK: 22 }],
];

test.each(airs)('%s – heat in and out, with a screw at 40 °C – balance to 1e-6', (_, change) => {
  const solution = solved(hardBoard(), powers, change);
  expect(solution.status).toBe('converged');
  expect(solution.energy.inW).toBeCloseTo(1.45, 12);
  expect(solution.energy.imbalance).toBeLessThan(1e-6);
});

test.each(airs.slice(0, 5))(
  '%s – no heat of its own beside a screw at 40 °C – what the screw gives leaves again',
  (_, change) => {
    const solution = solved(hardBoard(), { U1: 0, U2: 0, Q1: 0 }, change);
    expect(solution.status).toBe('converged');
    expect(solution.energy.inW).toBe(0);
    // Without heat in, the imbalance is in watts; the screw brings some 0.1 W.
    expect(solution.energy.imbalance).toBeLessThan(1e-7);
    expect(solution.board.maxC).toBeGreaterThan(25.1);
  },
);

test('temperatures that are wrong in one cell – the balance – shows it, whatever the solver said', () => {
  const board = hardBoard();
  const model = buildBoardModel(board, { cellMm: 1 });
  const heat = heatOf(board, powers);
  const rises = solveRises(model, board.conditions[0]!, heat);
  rises.rise[0]! += 0.5;
  expect(energyBalance(model, heat, rises).imbalance).toBeGreaterThan(1e-6);
});

test('heat on a source that lies off the board – is not counted as going in', () => {
  const board = hardBoard({ sources: [{ ref: 'Q1', at: [90, 90], sizeMm: [2, 2], powerW: 1 }] });
  const solution = solved(board, powers);
  expect(solution.energy.inW).toBeCloseTo(1.2, 12);
  expect(solution.energy.imbalance).toBeLessThan(1e-6);
});

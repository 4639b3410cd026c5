import { expect, test } from 'vitest';
import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import { maximumIterations } from '#core/thermal/method.ts';
import { hardBoard } from './hard-board.ts';
import { solved } from './solved-board.ts';

const board = hardBoard();
const [thin, thick] = board.stackup.dielectric;

/** Copper of 390 W/(m·K) against laminate of 0.05: a ratio of almost 1e4; layers of 1 and 500 µm, slabs of 10 µm and 10 mm. */
const extremes: Board = {
  ...board,
  stackup: {
    ...board.stackup,
    copper: board.stackup.copper.map((layer, k) => ({ ...layer, thicknessUm: [500, 1, 300][k]! })),
    dielectric: [
      { ...thin!, thicknessMm: 0.01, inPlaneWPerMK: 0.05, throughWPerMK: 0.05 },
      { ...thick!, thicknessMm: 10, inPlaneWPerMK: 0.05, throughWPerMK: 500 },
    ],
  },
};

test.each<[string, Board, Partial<Condition>, number]>([
  ['the worst stack-up, a film of 1 W/(m²·K), 1 mW', extremes, { filmWPerM2K: 1 }, 1e-3],
  ['the worst stack-up, a film of 1000 W/(m²·K), 50 W', extremes, { filmWPerM2K: 1000 }, 50],
  ['the worst stack-up, still air, 0.5 W', extremes, {}, 0.5],
  ['a usual one, 0.1 W/(m²·K), the least a film may be', board, { filmWPerM2K: 0.1 }, 0.5],
  ['a usual one, 100 000 W/(m²·K) on one face', board, { filmWPerM2K: { top: 1e5, bottom: 0.1 } }, 50],
  ['the worst stack-up in moving air', extremes, { air: { kind: 'moving', speedMPerS: 3, towardDeg: 45 } }, 2],
])('%s – the solution – converges in balance within its iterations', (_, given, change, power) => {
  const solution = solved(given, { U1: power, U2: power / 3, Q1: power / 10 }, change, 0.8);
  expect(solution.message).toBeNull();
  expect(solution.status).toBe('converged');
  expect(solution.energy.imbalance).toBeLessThan(1e-6);
  expect(solution.solver.residual).toBeLessThan(1e-8);
  expect(solution.solver.iterations).toBeLessThan(maximumIterations);
});

import { expect, test } from 'vitest';
import type { Board } from '#core/board/document.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { gridError } from '#core/thermal/grid-error.ts';
import { solveCondition } from '#core/thermal/solve-condition.ts';
import { fr4, publishedBoard, rectangle } from '#test/cases/board-of.ts';
import { hardBoard } from './hard-board.ts';
import { heatOf } from './solved-board.ts';

/** A part on a pour, everything on the lines of all the grids, so that the discretisation alone is seen. */
const smooth = publishedBoard({
  bodyMm: [6, 6, 1],
  caseTopKPerW: 50,
  lands: [{ name: 'tab', kind: 'tab', kPerW: 4, pads: [{ at: [0, 0], sizeMm: [4, 4] }] }],
  outline: { points: rectangle(32, 24, [16, 12]) },
  stackup: {
    copper: [
      { name: 'L1', thicknessUm: 35 },
      { name: 'L2', thicknessUm: 35 },
    ],
    dielectric: [fr4(1.5)],
    maxOperatingC: 130,
  },
  pours: [
    { id: 'p1', layer: 'L1', net: 'T', points: rectangle(16, 12, [16, 12]) },
    { id: 'p2', layer: 'L2', net: 'T', points: rectangle(24, 16, [16, 12]) },
  ],
  at: [16, 12],
  filmWPerM2K: 12,
});

/** Junction rises on cells of a size, and the grid error that the product states there; share of the rise. */
function onGrid(board: Board, cellMm: number) {
  const model = buildBoardModel(board, { cellMm });
  const solution = solveCondition(model, board.conditions[0]!, heatOf(board, { U1: 1, U2: 0.5, Q1: 0.2 }), {
    gridError: true,
  });
  const { junctionC, gridErrorK } = solution.regulators.get('U1')!;
  return { rise: junctionC - 25, stated: gridErrorK!, share: gridErrorK! / (junctionC - 25) };
}

test('four grids on a smooth board, lands uncorrected – changes of the junction – fall with an order from 1 to 2.2', () => {
  const rises = [2, 1, 0.5, 0.25].map((cellMm) => {
    const model = buildBoardModel(smooth, { cellMm, correctLands: false });
    const solution = solveCondition(model, smooth.conditions[0]!, heatOf(smooth, { U1: 1 }));
    return solution.regulators.get('U1')!.junctionC - 25;
  });
  const changes = rises.slice(1).map((rise, k) => rises[k]! - rise);
  for (const k of [0, 1]) {
    const order = Math.log2(changes[k]! / changes[k + 1]!);
    expect(order).toBeGreaterThan(1);
    expect(order).toBeLessThan(2.2);
  }
  // Roache's band of the last three grids covers what the extrapolated value still lies away.
  const order = Math.log2(changes[1]! / changes[2]!);
  const left = changes[2]! / (2 ** order - 1);
  expect(gridError([rises[3]!, rises[2]!, rises[1]!])).toBeCloseTo(1.25 * left, 9);
});

test.each<[string, Board]>([
  ['the smooth board', smooth],
  ['the hard board', hardBoard()],
])('%s, cells of 0.5 and 1 mm – stated grid error – covers the distance to cells of 0.125 mm', (_, board) => {
  const fine = onGrid(board, 0.125);
  for (const cellMm of [0.5, 1]) {
    const { rise, stated } = onGrid(board, cellMm);
    expect(stated, String(cellMm)).toBeGreaterThan(Math.abs(rise - fine.rise));
  }
});

test.each<[string, Board]>([
  ['the smooth board', smooth],
  ['the hard board', hardBoard()],
])('%s on the product’s own cells of 0.25 mm – grid error – at most a thirtieth of the rise', (_, board) => {
  expect(onGrid(board, 0.25).share).toBeLessThan(0.03);
});

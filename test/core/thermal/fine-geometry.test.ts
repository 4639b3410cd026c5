import { expect, test } from 'vitest';
import type { Board } from '#core/board/document.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { solveCondition } from '#core/thermal/solve-condition.ts';
import { fr4, publishedBoard, rectangle } from '../../cases/board-of.ts';

const twoLayers = {
  copper: [
    { name: 'L1', thicknessUm: 35 },
    { name: 'L2', thicknessUm: 35 },
  ],
  dielectric: [fr4(1.53)],
  maxOperatingC: 130,
};

/** One lead land of 1 × 1 mm over a whole back layer, its case top as good as closed. */
const lonely = (at: [number, number]): Board =>
  publishedBoard({
    bodyMm: [1, 1, 1],
    caseTopKPerW: 1e6,
    lands: [{ name: 'lead', kind: 'lead', kPerW: 45, pads: [{ at: [0, 0], sizeMm: [1, 1] }] }],
    outline: { points: rectangle(15, 15, [7.5, 7.5]) },
    stackup: twoLayers,
    pours: [{ id: 'p2', layer: 'L2', net: 'GND', points: rectangle(15, 15, [7.5, 7.5]) }],
    at,
    filmWPerM2K: 10,
  });

function riseOf(board: Board, cellMm: number, correctLands?: boolean) {
  const model = buildBoardModel(board, { cellMm, ...(correctLands !== undefined && { correctLands }) });
  const solution = solveCondition(model, board.conditions[0]!, {
    regulatorsW: new Map([['U1', 1]]),
    sourcesW: new Map(),
  });
  const { junctionC, landC } = solution.regulators.get('U1')!;
  return { junctionK: junctionC - 25, landK: landC - 25 };
}

test('a lonely land of 1 mm – anywhere on cells of 0.5 mm – is that of cells of 0.1 mm within 5 %, and nearer than uncorrected', () => {
  const fine = riseOf(lonely([7.5, 7.5]), 0.1);
  // Above the rise of the whole board, which the cells cannot miss: 1 W into 10 W/(m²·K) on both faces.
  const board = 1 / (2 * 10 * 225e-6);
  const missed = (given: Board, correct: boolean) =>
    (riseOf(given, 0.5, correct).landK - board) / (fine.landK - board) - 1;
  const square = { corrected: 0, plain: 0 };
  for (const [dx, dy] of [
    [0, 0],
    [0.13, 0.06],
    [0.25, 0.25],
    [0.38, 0.19],
  ] as const) {
    const given = lonely([7.5 + dx, 7.5 + dy]);
    const error = missed(given, true);
    expect(Math.abs(error)).toBeLessThan(0.05);
    square.corrected += error ** 2;
    square.plain += missed(given, false) ** 2;
  }
  expect(square.corrected).toBeLessThan(square.plain / 4);
});

test('a corrected land – its temperature – still lies its own resistance below the junction', () => {
  const { junctionK, landK } = riseOf(lonely([7.63, 7.56]), 0.5);
  expect(junctionK - landK).toBeCloseTo(45, 1);
});

test('a gap between two nets – wherever it falls on the cells – parts them alike', () => {
  // Halves of two nets that touch at x: the clearance between them is laminate. A gap at a cell centre counts like any other.
  const rises = [10, 10.1, 10.25, 10.4, 10.5].map((x) => {
    const board = publishedBoard({
      bodyMm: [1, 1, 1],
      caseTopKPerW: 1e6,
      lands: [{ name: 'tab', kind: 'tab', kPerW: 1, pads: [{ at: [0, 0], sizeMm: [6, 6] }] }],
      outline: { points: rectangle(20, 10, [x, 5]) },
      stackup: twoLayers,
      pours: [
        { id: 'p1', layer: 'L1', net: 'T', points: rectangle(10, 10, [x - 5, 5]) },
        { id: 'p2', layer: 'L1', net: 'OTHER', points: rectangle(10, 10, [x + 5, 5]) },
      ],
      at: [x - 5, 5],
      filmWPerM2K: 10,
    });
    // The outline is held, so that the cells do not move with the copper.
    return riseOf({ ...board, outline: { points: rectangle(24, 10, [10, 5]), cutouts: [] } }, 0.5).junctionK;
  });
  const mean = rises.reduce((sum, rise) => sum + rise, 0) / rises.length;
  for (const rise of rises) expect(Math.abs(rise / mean - 1)).toBeLessThan(0.02);
});

test('a part on the bottom of a symmetric board – fixed films – is as warm as on top', () => {
  const board = publishedBoard({
    bodyMm: [4, 3, 1],
    caseTopKPerW: 40,
    lands: [
      { name: 'tab', kind: 'tab', kPerW: 5, pads: [{ at: [0.8, 0], sizeMm: [2, 2] }] },
      { name: 'lead', kind: 'lead', kPerW: 60, pads: [{ at: [-2, 0.5], sizeMm: [1, 0.8] }] },
    ],
    outline: { points: rectangle(30, 20, [15, 10]) },
    stackup: twoLayers,
    pours: ['L1', 'L2'].map((layer) => ({ id: layer, layer, net: 'T', points: rectangle(9, 9, [15, 10]) })),
    at: [15, 10],
    filmWPerM2K: 12,
  });
  const below = {
    ...board,
    regulators: board.regulators.map((regulator) => ({ ...regulator, side: 'bottom' as const })),
  };
  expect(riseOf(below, 0.5).junctionK / riseOf(board, 0.5).junctionK).toBeCloseTo(1, 5);
});

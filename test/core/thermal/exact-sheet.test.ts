import { expect, test } from 'vitest';
import { checkBoard } from '#core/check/check-board.ts';
import { publishedBoard, rectangle, square } from '../../cases/board-of.ts';

/*
 * Thin board with a fixed film: G·∇²T − H·T + q = 0, insulated edges. G = 390·35e-6 + 0.8·1.6e-3 = 0.01493 W/K, H = 20
 * W/(m²·K) (both faces 10), 1 W on 10 × 10 mm of 50 × 50 mm. Exact: double cosine series of 600 × 600 terms, computed
 * for this test. The through conductivity is set high, so that the board is one sheet.
 */
const board = publishedBoard({
  bodyMm: [0.2, 0.2, 0.1],
  caseTopKPerW: 1e6,
  lands: [{ name: 'area', kind: 'lead', kPerW: 1000, pads: [{ at: [0, 0], sizeMm: [10, 10] }] }],
  outline: { points: rectangle(50, 50, [25, 25]) },
  stackup: {
    copper: [
      { name: 'L1', thicknessUm: 35 },
      { name: 'L2', thicknessUm: 35 },
    ],
    dielectric: [{ thicknessMm: 1.6, inPlaneWPerMK: 0.8, throughWPerMK: 100 }],
    maxOperatingC: 130,
  },
  pours: [{ id: 'p1', layer: 'L1', net: 'T', points: square(50, [25, 25]) }],
  at: [25, 25],
  filmWPerM2K: 10,
  probes: [
    { id: 'centre', at: [25, 25] },
    { id: 'off', at: [30, 25] },
    { id: 'edge', at: [25, 0.05] },
    { id: 'corner', at: [0.05, 0.05] },
  ],
});
const exact = { centre: 33.92, off: 29.79, edge: 18.36, corner: 16.79 };

const rises = (cellMm: number) => {
  const { result } = checkBoard(board, [], { cellMm, gridError: false });
  return Object.fromEntries(result.conditions[0]!.probes.map(({ id, temperatureC }) => [id, temperatureC! - 25]));
};

test('sheet with a square source – cells of 0.5 mm – is the exact series within 1 %', () => {
  const found = rises(0.5);
  for (const [id, rise] of Object.entries(exact)) expect(Math.abs(found[id]! / rise - 1), id).toBeLessThan(0.01);
});

test('sheet with a square source – cells halved again and again – changes ever less', () => {
  // Cells that divide both the board and the source, so that the discretisation alone is seen.
  const [a, b, c, d] = [5, 2.5, 1.25, 0.625].map((cell) => rises(cell).centre!);
  const changes = [Math.abs(a! - b!), Math.abs(b! - c!), Math.abs(c! - d!)];
  expect(changes[1]).toBeLessThan(changes[0]! / 2);
  expect(changes[2]).toBeLessThan(changes[1]! / 2);
});

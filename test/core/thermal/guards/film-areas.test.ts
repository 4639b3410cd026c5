import { expect, test } from 'vitest';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import type { Face } from '#core/thermal/film-areas.ts';
import { rectangle } from '#test/cases/board-of.ts';
import { hardBoard } from './hard-board.ts';

const plain = hardBoard({ second: false, sinks: [] });
const board = {
  ...plain,
  stackup: { ...plain.stackup, emissivityTop: 0.8, emissivityBottom: 0.6 },
  pours: [
    { ...plain.pours[0]!, emissivity: 0.1, holes: [], points: rectangle(10, 9, [8, 10]) },
    { ...plain.pours[1]!, emissivity: 0.2, points: rectangle(12, 14, [9, 10]) },
    // Inside the board no face looks at it.
    { ...plain.pours[0]!, id: 'inner', layer: 'L2', emissivity: 0.01, holes: [], points: rectangle(30, 18, [16, 10]) },
  ],
  sources: [{ ...plain.sources[0]!, at: [20, 5] as [number, number], rotationDeg: 0 }],
};
const { grid, top, bottom } = buildBoardModel(board, { cellMm: 1 });
const at = (x: number, y: number) => Math.floor(y / grid.dyMm) * grid.columns + Math.floor(x / grid.dxMm);
const sum = ({ area }: Face) => area.reduce((total, value) => total + value, 0) * 1e6;

test('faces – emissivity of a cell – that of the pour over it, of the face elsewhere, by area where both meet', () => {
  expect(top.emissivity[at(4.5, 7.5)]).toBeCloseTo(0.1, 6);
  expect(top.emissivity[at(25.5, 15.5)]).toBeCloseTo(0.8, 6);
  expect(bottom.emissivity[at(4.5, 4.5)]).toBeCloseTo(0.2, 6);
  expect(bottom.emissivity[at(25.5, 15.5)]).toBeCloseTo(0.6, 6);
  // The upper pour begins at y = 5.5, in the middle of its cell.
  expect(top.emissivity[at(5.5, 5.5)]).toBeCloseTo((0.1 + 0.8) / 2, 6);
});

test('faces – area – the board less the body on it, more the sides of a source’s body', () => {
  // Body of 4 × 4 mm; the source’s body of 2 × 3 × 1 mm has sides of 2·(2 + 3)·1 mm².
  expect(sum(top)).toBeCloseTo(640 - 16 + 10, 3);
  expect(sum(bottom)).toBeCloseTo(640, 3);
  expect(top.area[at(8.5, 10.5)]).toBe(0);
});

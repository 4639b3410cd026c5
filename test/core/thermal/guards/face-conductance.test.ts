import { expect, test } from 'vitest';
import type { CopperMap, LayerCopper } from '#core/thermal/copper-map.ts';
import { faceConductances } from '#core/thermal/face-conductance.ts';

/** Two cells side by side in x or in y, of 2 × 1 mm, 2 × 2 sub-cells each; rows of sub-cells from the lowest. */
function face(along: 'x' | 'y', nets: number[][], board = nets.map((row) => row.map(() => 1))) {
  const grid = {
    x0Mm: 0,
    y0Mm: 0,
    dxMm: 2,
    dyMm: 1,
    columns: along === 'x' ? 2 : 1,
    rows: along === 'x' ? 1 : 2,
    split: 2,
  };
  const map: CopperMap = { grid, inside: Uint8Array.from(board.flat()), layers: [], netNumber: () => 1 };
  const layer: LayerCopper = {
    net: Int16Array.from(nets.flat()),
    sheet: Float32Array.from(nets.flat(), (net) => (net ? 1 : 0)),
  };
  const { gx, gy } = faceConductances(map, layer, 0.125);
  return along === 'x' ? gx[0]! : gy[0]!;
}

// Copper 1 W/K a square, laminate 0.125 W/K. Between the centres lie sub-columns 1 and 2 of both rows.
const copper = 1.125;

test('copper everywhere – a face – k·t times width over length, also of cells that are not square', () => {
  const rows = [
    [1, 1, 1, 1],
    [1, 1, 1, 1],
  ];
  expect(face('x', rows)).toBeCloseTo(copper * (1 / 2), 12);
  const columns = Array.from({ length: 4 }, () => [1, 1]);
  expect(face('y', columns)).toBeCloseTo(copper * (2 / 1), 12);
});

test('a trace along, half the width – a face – copper and laminate side by side', () => {
  const rows = [
    [1, 1, 1, 1],
    [0, 0, 0, 0],
  ];
  expect(face('x', rows)).toBeCloseTo(((copper + 0.125) / 2) * (1 / 2), 12);
});

test('a slot across – a face – copper and laminate one after the other', () => {
  const rows = [
    [1, 1, 0, 1],
    [1, 1, 0, 1],
  ];
  expect(face('x', rows)).toBeCloseTo((2 / (1 / copper + 1 / 0.125)) * (1 / 2), 12);
});

test('a slot half across – a face – the geometric mean of the two bounds of the resistor network', () => {
  const rows = [
    [1, 1, 1, 1],
    [1, 1, 0, 1],
  ];
  // Lines that exchange nothing are the lower bound, columns of one temperature the upper.
  const lower = 1 / (2 / copper) + 1 / (1 / copper + 1 / 0.125);
  const upper = 1 / (1 / (2 * copper) + 1 / (copper + 0.125));
  expect(face('x', rows)).toBeCloseTo(Math.sqrt(lower * upper) * (1 / 2), 12);
  const turned = [
    [1, 1],
    [1, 1],
    [1, 0],
    [1, 1],
  ];
  expect(face('y', turned)).toBeCloseTo(Math.sqrt(lower * upper) * (2 / 1), 12);
});

test('two nets that touch between the centres – a face – has the usual gap of 0.2 mm of laminate in it', () => {
  const rows = [
    [1, 1, 2, 2],
    [1, 1, 2, 2],
  ];
  // Two squares of copper 1 mm wide over 2 mm of width, and 0.2 mm of laminate across them.
  const resistance = 2 / (copper * 1) + 0.2 / (0.125 * 1);
  const single = face(
    'x',
    rows.map((row) => row.map(() => 1)),
  );
  expect(face('x', rows)).toBeLessThan(single / 1.5);
  expect(1 / face('x', rows)).toBeCloseTo(resistance, 9);
});

test('no board between the centres – a face – conducts nothing', () => {
  const rows = [
    [1, 1, 1, 1],
    [1, 1, 1, 1],
  ];
  expect(
    face('x', rows, [
      [1, 1, 0, 1],
      [1, 1, 0, 1],
    ]),
  ).toBe(0);
});

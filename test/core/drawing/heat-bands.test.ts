import { expect, test } from 'vitest';
import type { HeatField } from '#core/thermal/heat-field.ts';
import { decodeHeatField } from '#web/heat/decode-heat-field.ts';
import { heatBands, isotherms } from '#core/drawing/heat-bands.ts';
import { heatScale } from '#core/drawing/heat-scale.ts';
import { isothermLabels } from '#core/drawing/isotherm-label.ts';
import { temperatureAt, temperatureRange } from '#web/heat/temperature-at.ts';

/** Rows from the lowest y upwards, as in a heat field. */
function field(rows: readonly (readonly number[])[], xEdges: readonly number[], yEdges: readonly number[]): HeatField {
  return {
    columns: rows[0]?.length ?? 0,
    rows: rows.length,
    xEdgesMm: Float64Array.from(xEdges),
    yEdgesMm: Float64Array.from(yEdges),
    layers: [{ name: 'L1', temperatureC: Float32Array.from(rows.flat()) }],
  };
}

test('isotherm – one hot cell of 30 °C among 20 °C, line at 25 °C – a diamond half a cell wide around its centre', () => {
  const hot = field(
    [
      [20, 20, 20],
      [20, 30, 20],
      [20, 20, 20],
    ],
    [0, 2, 4, 6],
    [0, 2, 4, 6],
  );
  const [line] = isotherms(hot, 'L1', [25]);
  const corners = new Set(line?.rings[0]?.map(([x, y]) => `${x.toFixed(6)} ${y.toFixed(6)}`));
  // Linear between the centres 2 mm apart: 25 °C lies 1 mm from the hot centre (3, 3).
  expect(corners).toEqual(
    new Set(['4.000000 3.000000', '3.000000 4.000000', '2.000000 3.000000', '3.000000 2.000000']),
  );
});

test('isotherm – cells of unequal width – its place follows the cell centres', () => {
  // Centres at 1 and 6 mm: 25 °C, half-way between 20 and 30 °C, lies at 3.5 mm.
  const graded = field(
    [
      [20, 30],
      [20, 30],
      [20, 30],
    ],
    [0, 2, 10],
    [0, 1, 2, 3],
  );
  const [line] = isotherms(graded, 'L1', [25]);
  const xs = line?.rings.flat().map(([x]) => x) ?? [];
  expect(Math.min(...xs)).toBeCloseTo(3.5, 9);
});

test('isotherm – at a temperature that the layer does not reach, or on a layer that is not there – none', () => {
  const even = field(
    [
      [20, 20],
      [20, 20],
    ],
    [0, 1, 2],
    [0, 1, 2],
  );
  expect(isotherms(even, 'L1', [40])).toEqual([]);
  expect(isotherms(even, 'L9', [20])).toEqual([]);
});

test('bands – beside cells without board – reach beyond the board, so that clipping leaves no bare rim', () => {
  const corner = field(
    [
      [50, NaN],
      [50, 50],
    ],
    [0, 1, 2],
    [0, 1, 2],
  );
  const bands = heatBands(corner, 'L1', heatScale(40, 60));
  const ground = bands[0]?.polygons.flat(2) ?? [];
  expect(Math.min(...ground.map(([x]) => x))).toBeLessThan(0);
  expect(Math.max(...ground.map(([x]) => x))).toBeGreaterThan(2);
  expect(bands.every((band) => /^#[0-9a-f]{6}$/.test(band.colour))).toBe(true);
});

test('temperature at a place – inside a cell, on the upper border, off the board, in an empty cell', () => {
  const four = field(
    [
      [10, 20],
      [30, NaN],
    ],
    [0, 1, 3],
    [0, 1, 2],
  );
  expect(temperatureAt(four, 'L1', [0.5, 0.5])).toBe(10);
  expect(temperatureAt(four, 'L1', [3, 0.2])).toBe(20);
  expect(temperatureAt(four, 'L1', [3.01, 0.2])).toBeNull();
  expect(temperatureAt(four, 'L1', [2, 1.5])).toBeNull();
  expect(temperatureRange(four, 'L1')).toEqual({ minC: 10, maxC: 30 });
});

test('heat field of the server – little-endian Float32 in base64, NaN included – the same numbers', () => {
  const bytes = new Uint8Array(12);
  const view = new DataView(bytes.buffer);
  [71.5, NaN, -3.25].forEach((value, index) => view.setFloat32(index * 4, value, true));
  const decoded = decodeHeatField({
    condition: 'Hot',
    columns: 3,
    rows: 1,
    xEdgesMm: [0, 1, 2, 3],
    yEdgesMm: [0, 1],
    layers: [{ name: 'L1', temperatureC: btoa(String.fromCharCode(...bytes)) }],
  });
  expect([...(decoded.layers[0]?.temperatureC ?? [])]).toEqual([71.5, NaN, -3.25]);
});

test('labels – no free place on one line – that line stays without, unless it must have one', () => {
  const ring = [
    [0, 0],
    [4, 0],
    [4, 4],
    [0, 4],
  ] as const;
  const lines = [{ valueC: 110, rings: [ring] }];
  expect(isothermLabels(lines, () => false, 1)).toEqual([]);
  expect(
    isothermLabels(
      lines,
      () => false,
      1,
      () => true,
    ),
  ).toEqual([{ valueC: 110, at: [0, 0] }]);
});

import { expect, test } from 'vitest';
import { placedPoint } from '#core/geometry/placed-rectangle.ts';
import { polygonArea, polygonContains, signedArea } from '#core/geometry/polygon.ts';
import { distanceToEdge, isSimplePolygon, polygonsOverlap } from '#core/geometry/ring-checks.ts';

type Ring = [number, number][];
const unit: Ring = [
  [0, 0],
  [4, 0],
  [4, 3],
  [0, 3],
];

test('area – of a rectangle – has the sign of its sense of rotation', () => {
  expect(signedArea(unit)).toBe(12);
  expect(signedArea([...unit].reverse())).toBe(-12);
  expect(polygonArea([...unit].reverse())).toBe(12);
});

test('contains – a notch – is outside', () => {
  const notched: Ring = [
    [0, 0],
    [4, 0],
    [4, 3],
    [2, 1],
    [0, 3],
  ];
  expect(polygonContains(notched, 2, 0.5)).toBe(true);
  expect(polygonContains(notched, 2, 2)).toBe(false);
});

test.each<[string, Ring, boolean]>([
  ['a rectangle', unit, true],
  [
    'a bow tie',
    [
      [0, 0],
      [4, 3],
      [4, 0],
      [0, 3],
    ],
    false,
  ],
  [
    'an edge folded back on itself',
    [
      [0, 0],
      [4, 0],
      [2, 0],
      [2, 3],
    ],
    false,
  ],
  [
    'a corner given twice',
    [
      [0, 0],
      [4, 0],
      [4, 0],
      [0, 3],
    ],
    false,
  ],
  [
    'a corner on another edge',
    [
      [0, 0],
      [4, 0],
      [4, 3],
      [2, 0],
      [0, 3],
    ],
    false,
  ],
])('simple – %s – is told', (_name, ring, simple) => {
  expect(isSimplePolygon(ring)).toBe(simple);
});

test('overlap – beside, crossing, inside – is told', () => {
  const moved = (dx: number, dy: number): Ring => unit.map(([x, y]) => [x + dx, y + dy]);
  expect(polygonsOverlap(unit, moved(5, 0))).toBe(false);
  expect(polygonsOverlap(unit, moved(3, 2))).toBe(true);
  expect(
    polygonsOverlap(unit, [
      [1, 1],
      [2, 1],
      [2, 2],
      [1, 2],
    ]),
  ).toBe(true);
});

test('distance – from inside – is that to the nearest edge', () => {
  expect(distanceToEdge(unit, 1, 1.4)).toBeCloseTo(1, 12);
});

test('a part – turned by 90°, on the bottom – is mirrored first', () => {
  const at = { at: [10, 5] as const, rotationDeg: 90 };
  const [x, y] = placedPoint({ ...at, side: 'top' }, 2, 0);
  expect([x, y]).toEqual([expect.closeTo(10, 12), expect.closeTo(7, 12)]);
  const [bx, by] = placedPoint({ ...at, side: 'bottom' }, 2, 0);
  expect([bx, by]).toEqual([expect.closeTo(10, 12), expect.closeTo(3, 12)]);
});

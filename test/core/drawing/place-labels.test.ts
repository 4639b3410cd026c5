import { expect, test } from 'vitest';
import { placeLabels } from '#core/drawing/place-labels.ts';

const bounds = { x: 0, y: 0, width: 100, height: 100 };
const label = { width: 20, height: 6 };

test('labels – one box in the middle – the label stands above it, centred', () => {
  const [place] = placeLabels([{ box: { x: 40, y: 40, width: 10, height: 10 }, ...label }], bounds, [], 1);
  // x: 45 − 10; y: 40 − 6 − 1.
  expect(place).toEqual({ x: 35, y: 33, ...label });
});

test('labels – an obstacle above – the label goes below', () => {
  const box = { x: 40, y: 40, width: 10, height: 10 };
  const [place] = placeLabels([{ box, ...label }], bounds, [{ x: 30, y: 20, width: 30, height: 19 }], 1);
  expect(place).toMatchObject({ x: 35, y: 51 });
});

test('labels – a box at the edge – the label is moved into the bounds', () => {
  const [place] = placeLabels([{ box: { x: 95, y: 50, width: 5, height: 5 }, ...label }], bounds);
  expect(place!.x + place!.width).toBeLessThanOrEqual(100);
});

test('labels – two boxes on one place – their labels do not overlap', () => {
  const box = { x: 40, y: 40, width: 10, height: 10 };
  const [a, b] = placeLabels(
    [
      { box, ...label },
      { box, ...label },
    ],
    bounds,
  );
  expect(Math.abs(a!.y - b!.y)).toBeGreaterThanOrEqual(label.height);
});

test('labels – no room right beside the box – the label goes further away rather than cover something', () => {
  const box = { x: 45, y: 45, width: 10, height: 10 };
  // A frame 10 wide around the box: nothing next to the box is free, and only beyond it does the label clear all.
  const frame = { x: 35, y: 35, width: 30, height: 30 };
  const [place] = placeLabels([{ box, ...label }], bounds, [frame, box]);
  const { x, y } = place!;
  expect(x + label.width <= 35 || x >= 65 || y + label.height <= 35 || y >= 65).toBe(true);
});

import { expect, test } from 'vitest';
import { leaderLine } from '#core/drawing/leader-line.ts';

const box = { x: 10, y: 10, width: 10, height: 10 };

test('leader – a label right above its box – no line', () => {
  // Gap: 10 − (2 + 6) = 2.
  expect(leaderLine(box, { x: 8, y: 2, width: 20, height: 6 }, 3)).toBeNull();
});

test('leader – a label moved up and right – from the corner of the box to the corner of the label', () => {
  expect(leaderLine(box, { x: 30, y: 0, width: 20, height: 6 }, 3)).toEqual([
    [20, 10],
    [30, 6],
  ]);
});

test('leader – a label far below, over part of the width – straight down the middle of what they share', () => {
  // Shared x: 15 … 20.
  expect(leaderLine(box, { x: 15, y: 40, width: 20, height: 6 }, 3)).toEqual([
    [17.5, 20],
    [17.5, 40],
  ]);
});

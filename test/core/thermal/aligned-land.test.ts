import { expect, test } from 'vitest';
import { isolatedLand, junctionRises } from '#test/bench/land-accuracy.ts';

/*
 * A land of 1 mm alone on bare laminate, its package next to no resistance. On cells of 1 mm the cells hinder the heat by up to a
 * quarter where the land fills one of them, and help it where it lies across two or four; the reference is the same board on
 * cells of 0.1 mm, itself within 0.6 % of cells of 0.05 mm.
 */
test.each([
  [0, 0],
  [0.25, 0],
  [0.5, 0.5],
  [0.75, 0.5],
] as const)('land shifted by %s and %s cells – rise on coarse cells – that on fine ones within 5 %%', (dx, dy) => {
  const board = isolatedLand(dx, dy);
  const [coarse] = junctionRises(board, 1);
  const [fine] = junctionRises(board, 0.1);
  expect(Math.abs(coarse! / fine! - 1)).toBeLessThan(0.05);
});

import fc from 'fast-check';
import { expect, test } from 'vitest';
import { labelHeights } from '#web/ladder/label-heights.ts';

test('labels – that stand apart – stay where they are wanted', () => {
  expect(labelHeights([250, 180, 60], 18, 20, 280)).toEqual([250, 180, 60]);
});

test('labels – however they are wanted – never touch and stay in range while there is room', () => {
  fc.assert(
    fc.property(fc.array(fc.double({ min: 20, max: 280, noNaN: true }), { minLength: 1, maxLength: 8 }), (heights) => {
      const wanted = heights.toSorted((a, b) => b - a);
      const placed = labelHeights(wanted, 18, 20, 280);
      placed.forEach((height, index) => {
        expect(height).toBeGreaterThanOrEqual(20 - 1e-9);
        expect(height).toBeLessThanOrEqual(280 + 1e-9);
        const above = placed[index + 1];
        if (above !== undefined) expect(height - above).toBeGreaterThanOrEqual(18 - 1e-9);
      });
    }),
    { seed: 61703 },
  );
});

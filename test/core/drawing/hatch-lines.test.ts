import { expect, test } from 'vitest';
import { hatchLines } from '#core/drawing/hatch-lines.ts';

test('hatch – neighbouring boxes – their lines lie on one raster', () => {
  // Along x + y = c, a multiple of 3·√2 for every line.
  for (const box of [
    { x: 0, y: 0, width: 20, height: 10 },
    { x: 20, y: 3, width: 7, height: 31 },
  ]) {
    const lines = hatchLines(box, 3, 45);
    expect(lines.length).toBe(Math.ceil((box.width + box.height) / (3 * Math.SQRT2)));
    for (const [x1, y1, x2, y2] of lines) {
      expect(x1 + y1).toBeCloseTo(x2 + y2, 9);
      const steps = (x1 + y1) / (3 * Math.SQRT2);
      expect(steps).toBeCloseTo(Math.round(steps), 9);
    }
  }
});

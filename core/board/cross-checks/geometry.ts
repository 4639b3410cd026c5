import { polygonArea } from '#core/geometry/polygon.ts';
import { isSimplePolygon } from '#core/geometry/ring-checks.ts';
import type { Report } from '../cross-check.ts';
import type { Board } from '../document.ts';
import type { Ring } from '../outline.ts';
import { ringInside } from './ring-inside.ts';

/** A ring that encloses less than this encloses nothing that could be made, mm². */
const leastAreaMm2 = 1e-4;

/** Rings are simple and have area; cut-outs lie inside the outline, holes inside their pour. */
export function checkGeometry(board: Board, report: Report) {
  const simple = (path: readonly PropertyKey[], ring: Ring) => {
    if (polygonArea(ring) < leastAreaMm2) report(path, 'must enclose an area of at least 0.0001 mm²');
    else if (!isSimplePolygon(ring)) report(path, 'must not cross or touch itself');
  };
  const within = (path: readonly PropertyKey[], ring: Ring, outer: Ring, what: string) => {
    if (!ringInside(ring, outer)) report(path, `must lie inside ${what}`);
  };
  simple(['outline', 'points'], board.outline.points);
  board.outline.cutouts.forEach((cutout, i) => {
    simple(['outline', 'cutouts', i], cutout);
    within(['outline', 'cutouts', i], cutout, board.outline.points, 'the outline');
  });
  board.pours.forEach((pour, i) => {
    simple(['pours', i, 'points'], pour.points);
    pour.holes.forEach((hole, k) => {
      simple(['pours', i, 'holes', k], hole);
      within(['pours', i, 'holes', k], hole, pour.points, 'the pour');
    });
  });
}

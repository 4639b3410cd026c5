import type { Board } from '#core/board/document.ts';
import type { Point } from '#core/board/outline.ts';
import { tidyMm } from './tidy-mm.ts';
import { type ObjectKey, idOf, kindOf } from '../object-key.ts';

export type Transform = { point: (at: Point) => Point; turnDeg: number };

/** Applies a rigid motion to every named object; lists in which nothing is named stay the very same. */
export function transformObjects(board: Board, keys: readonly ObjectKey[], { point, turnDeg }: Transform): Board {
  const named = (kind: string) => new Set(keys.filter((key) => kindOf(key) === kind).map(idOf));
  const moved = <T>(list: T[], kind: string, id: (item: T) => string, move: (item: T) => T): T[] => {
    const ids = named(kind);
    return ids.size === 0 ? list : list.map((item) => (ids.has(id(item)) ? move(item) : item));
  };
  const placed = <T extends { at: Point }>(item: T): T => ({ ...item, at: point(item.at) });
  const turned = <T extends { at: Point; rotationDeg: number }>(item: T): T => ({
    ...placed(item),
    rotationDeg: plainAngle(item.rotationDeg + turnDeg),
  });
  const cutouts = named('cutout');
  const outlined = named('outline').size > 0;
  return {
    ...board,
    regulators: moved(board.regulators, 'regulator', (item) => item.ref, turned),
    sources: moved(board.sources, 'source', (item) => item.ref, turned),
    viaFields: moved(board.viaFields, 'via-field', (item) => item.id, turned),
    probes: moved(board.probes, 'probe', (item) => item.id, placed),
    sinks: moved(
      board.sinks,
      'sink',
      (item) => item.id,
      // A sink has no angle of its own: only whole quarter turns exchange its sides.
      (item) => ({
        ...placed(item),
        sizeMm: Math.round(turnDeg / 90) % 2 === 0 ? item.sizeMm : [item.sizeMm[1], item.sizeMm[0]],
      }),
    ),
    pours: moved(
      board.pours,
      'pour',
      (item) => item.id,
      (item) => ({ ...item, points: item.points.map(point), holes: item.holes.map((ring) => ring.map(point)) }),
    ),
    outline:
      cutouts.size === 0 && !outlined
        ? board.outline
        : {
            points: outlined ? board.outline.points.map(point) : board.outline.points,
            cutouts: board.outline.cutouts.map((ring, index) => (cutouts.has(String(index)) ? ring.map(point) : ring)),
          },
  };
}

/** Same direction, from −180 (not included) to 180°. */
function plainAngle(angleDeg: number): number {
  const turned = ((angleDeg % 360) + 360) % 360;
  return tidyMm(turned > 180 ? turned - 360 : turned);
}

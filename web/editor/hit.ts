import type { Board } from '#core/board/document.ts';
import type { Point } from '#core/board/outline.ts';
import { polygonContains } from '#core/geometry/polygon.ts';
import { distanceToEdge } from '#core/geometry/ring-checks.ts';
import { type ObjectKey, objectKey } from '#core/board/object-key.ts';
import { type Box, boxOf, cornersOf, objectRings } from '#core/board/object-rings.ts';

/**
 * Object below a point, the smallest kind first: probes, parts, heat sources, via fields, sinks, then copper of the
 * active layer, copper of the others, cut-outs, and the outline only along its edge.
 * @param reachMm how far beside a thin object a click still counts
 */
export function objectAt(board: Board, activeLayer: string, at: Point, reachMm: number): ObjectKey | null {
  const pours = board.pours.toReversed();
  const candidates: ObjectKey[] = [
    ...board.probes.map((probe) => objectKey('probe', probe.id)),
    ...board.regulators.map((regulator) => objectKey('regulator', regulator.ref)),
    ...board.sources.map((source) => objectKey('source', source.ref)),
    ...board.viaFields.map((field) => objectKey('via-field', field.id)),
    ...board.sinks.map((sink) => objectKey('sink', sink.id)),
    ...pours.filter((pour) => pour.layer === activeLayer).map((pour) => objectKey('pour', pour.id)),
    ...pours.filter((pour) => pour.layer !== activeLayer).map((pour) => objectKey('pour', pour.id)),
    ...board.outline.cutouts.map((_, index) => objectKey('cutout', index)),
  ];
  const found = candidates.find((key) => isHit(board, key, at, reachMm));
  if (found) return found;
  return distanceToEdge(board.outline.points, at[0], at[1]) <= reachMm ? objectKey('outline', '') : null;
}

function isHit(board: Board, key: ObjectKey, at: Point, reachMm: number): boolean {
  const rings = objectRings(board, key);
  if (key.startsWith('pour:'))
    return rings.reduce((inside, ring) => inside !== polygonContains(ring, at[0], at[1]), false);
  const box = boxOf(rings);
  if (!box) return false;
  if (rings.some((ring) => polygonContains(ring, at[0], at[1]))) return true;
  // Small things stay reachable at any zoom.
  const small = box.right - box.left < 2 * reachMm || box.top - box.bottom < 2 * reachMm;
  return (
    small &&
    at[0] >= box.left - reachMm &&
    at[0] <= box.right + reachMm &&
    at[1] >= box.bottom - reachMm &&
    at[1] <= box.top + reachMm
  );
}

/** Corner of a selected polygon below a point; null when there is none within reach. */
export function cornerAt(
  board: Board,
  selection: readonly ObjectKey[],
  at: Point,
  reachMm: number,
): { key: ObjectKey; index: number } | null {
  const [key] = selection;
  if (!key || selection.length !== 1) return null;
  const ring = cornersOf(board, key);
  const index = ring?.findIndex(([x, y]) => Math.hypot(x - at[0], y - at[1]) <= reachMm) ?? -1;
  return index >= 0 ? { key, index } : null;
}

/** Objects that lie wholly inside a box; the outline is never among them. */
export function objectsWithin(board: Board, keys: readonly ObjectKey[], box: Box): ObjectKey[] {
  return keys.filter((key) => {
    const own = key.startsWith('outline') ? null : boxOf(objectRings(board, key));
    return (
      own !== null && own.left >= box.left && own.right <= box.right && own.bottom >= box.bottom && own.top <= box.top
    );
  });
}

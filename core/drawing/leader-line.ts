import type { LabelBox } from './place-labels.ts';

type Point = readonly [number, number];

/**
 * Line from a box to the label that names it, between their nearest points; null where the label stands so close that
 * nobody would ask.
 * @param closeEnough distance up to which no line is needed, in the units of the boxes
 */
export function leaderLine(box: LabelBox, label: LabelBox, closeEnough: number): readonly [Point, Point] | null {
  const [x1, x2] = nearest(box.x, box.x + box.width, label.x, label.x + label.width);
  const [y1, y2] = nearest(box.y, box.y + box.height, label.y, label.y + label.height);
  if (Math.hypot(x2 - x1, y2 - y1) <= closeEnough) return null;
  return [
    [x1, y1],
    [x2, y2],
  ];
}

/** Nearest values of two ranges; where the ranges overlap, the middle of what they share, twice. */
function nearest(from: number, to: number, otherFrom: number, otherTo: number): [number, number] {
  if (otherFrom > to) return [to, otherFrom];
  if (otherTo < from) return [from, otherTo];
  const shared = (Math.max(from, otherFrom) + Math.min(to, otherTo)) / 2;
  return [shared, shared];
}

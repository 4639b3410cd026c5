/** A box in drawing units, y downwards or upwards alike. */
export type LabelBox = { x: number; y: number; width: number; height: number };

/** How many label heights away from its box a label may stand before it may as well cover something. */
const furthestSteps = 4;

/**
 * Places for labels beside the boxes that they name: above, below, right, left, then over it, then further and further
 * away; the first place that lies within the bounds and meets no label placed before and none of the obstacles. Where
 * every place meets something, the one that meets least.
 * @param anchors boxes to be named, with the size of each label, in order of importance
 * @param obstacles what labels should not cover
 * @returns one box per anchor, in the same order
 */
export function placeLabels(
  anchors: readonly { box: LabelBox; width: number; height: number }[],
  bounds: LabelBox,
  obstacles: readonly LabelBox[] = [],
  gap = 1,
): LabelBox[] {
  const placed: LabelBox[] = [];
  for (const { box, width, height } of anchors) {
    const candidates = [
      ...around(box, width, height, gap),
      [box.x + (box.width - width) / 2, box.y + (box.height - height) / 2] as const,
      ...Array.from({ length: furthestSteps }, (_, step) =>
        around(box, width, height, gap + (step + 1) * (height + gap)),
      ).flat(),
    ].map(([x, y]) => within({ x, y, width, height }, bounds));
    const cost = (candidate: LabelBox) =>
      placed.reduce((sum, other) => sum + 4 * overlap(candidate, other), 0) +
      obstacles.reduce((sum, other) => sum + overlap(candidate, other), 0);
    placed.push(candidates.reduce((best, candidate) => (cost(candidate) < cost(best) ? candidate : best)));
  }
  return placed;
}

/** Corners of a label above, below, right and left of a box, `away` from it; then in the four directions between. */
function around(box: LabelBox, width: number, height: number, away: number): (readonly [number, number])[] {
  const [left, right] = [box.x - width - away, box.x + box.width + away];
  const [top, bottom] = [box.y - height - away, box.y + box.height + away];
  const middleX = box.x + (box.width - width) / 2;
  const middleY = box.y + (box.height - height) / 2;
  return [
    [middleX, top],
    [middleX, bottom],
    [right, middleY],
    [left, middleY],
    [right, top],
    [right, bottom],
    [left, top],
    [left, bottom],
  ];
}

function within(box: LabelBox, bounds: LabelBox): LabelBox {
  const x = Math.max(bounds.x, Math.min(box.x, bounds.x + bounds.width - box.width));
  const y = Math.max(bounds.y, Math.min(box.y, bounds.y + bounds.height - box.height));
  return { ...box, x, y };
}

/** Area that two boxes share, in drawing units squared; 0 where they only touch. */
export function overlap(a: LabelBox, b: LabelBox): number {
  const width = Math.min(a.x + a.width, b.x + b.width) - Math.max(a.x, b.x);
  const height = Math.min(a.y + a.height, b.y + b.height) - Math.max(a.y, b.y);
  return width > 0 && height > 0 ? width * height : 0;
}

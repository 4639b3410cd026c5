/** Parallel lines across a box, `spacing` apart, all through one common raster so that neighbouring areas match. */
export function hatchLines(
  box: { x: number; y: number; width: number; height: number },
  spacing: number,
  angleDeg: 45 | 135,
): readonly (readonly [number, number, number, number])[] {
  const lines: [number, number, number, number][] = [];
  const sense = angleDeg === 45 ? 1 : -1;
  // A line is x + sense·y = c; c runs over the corners of the box.
  const corners = [box.x, box.x + box.width].flatMap((x) => [box.y, box.y + box.height].map((y) => x + sense * y));
  const step = spacing * Math.SQRT2;
  const first = Math.ceil(Math.min(...corners) / step) * step;
  for (let c = first; c < Math.max(...corners); c += step) {
    lines.push([c - sense * box.y, box.y, c - sense * (box.y + box.height), box.y + box.height]);
  }
  return lines;
}

import type { Point } from '#core/board/outline.ts';

/** What the canvas shows: the board point at its middle and the pixels per mm. Screen y points down, board y up. */
export type Camera = { centreMm: Point; pxPerMm: number };
export type ViewSize = { width: number; height: number };
/** Pixels from the canvas's upper left corner. */
export type ScreenPoint = readonly [number, number];

const closest = 200;
const furthest = 0.5;

export function toScreen(camera: Camera, view: ViewSize, [x, y]: readonly [number, number]): [number, number] {
  return [
    view.width / 2 + (x - camera.centreMm[0]) * camera.pxPerMm,
    view.height / 2 - (y - camera.centreMm[1]) * camera.pxPerMm,
  ];
}

export function toBoard(camera: Camera, view: ViewSize, [x, y]: ScreenPoint): Point {
  return [
    camera.centreMm[0] + (x - view.width / 2) / camera.pxPerMm,
    camera.centreMm[1] - (y - view.height / 2) / camera.pxPerMm,
  ];
}

/** Zooms by a factor; the board point below `at` stays where it is. */
export function zoomedAt(camera: Camera, view: ViewSize, at: ScreenPoint, factor: number): Camera {
  const pxPerMm = Math.min(closest, Math.max(furthest, camera.pxPerMm * factor));
  const [x, y] = toBoard(camera, view, at);
  return {
    pxPerMm,
    centreMm: [x - (at[0] - view.width / 2) / pxPerMm, y + (at[1] - view.height / 2) / pxPerMm],
  };
}

/** Moves the picture by pixels. */
export function panned(camera: Camera, dx: number, dy: number): Camera {
  return {
    ...camera,
    centreMm: [camera.centreMm[0] - dx / camera.pxPerMm, camera.centreMm[1] + dy / camera.pxPerMm],
  };
}

/** Shows all of the points with a margin around them. */
export function fitted(points: readonly (readonly [number, number])[], view: ViewSize, marginPx = 44): Camera {
  const xs = points.map((point) => point[0]);
  const ys = points.map((point) => point[1]);
  const [left, right] = [Math.min(...xs), Math.max(...xs)];
  const [bottom, top] = [Math.min(...ys), Math.max(...ys)];
  const pxPerMm = Math.min(
    (view.width - 2 * marginPx) / Math.max(right - left, 1),
    (view.height - 2 * marginPx) / Math.max(top - bottom, 1),
  );
  return {
    centreMm: [(left + right) / 2, (bottom + top) / 2],
    pxPerMm: Math.min(closest, Math.max(furthest, pxPerMm)),
  };
}

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

/** Pixels along the edges that other things lie over. */
export type Insets = { left: number; right: number; top: number; bottom: number };

/** Shows all of the points between the insets. */
export function fitted(points: readonly (readonly [number, number])[], view: ViewSize, insets: Insets): Camera {
  const xs = points.map((point) => point[0]);
  const ys = points.map((point) => point[1]);
  const [left, right] = [Math.min(...xs), Math.max(...xs)];
  const [bottom, top] = [Math.min(...ys), Math.max(...ys)];
  const width = Math.max(1, view.width - insets.left - insets.right);
  const height = Math.max(1, view.height - insets.top - insets.bottom);
  const fill = Math.min(width / Math.max(right - left, 1), height / Math.max(top - bottom, 1));
  const pxPerMm = Math.min(closest, Math.max(furthest, fill));
  return {
    centreMm: [
      (left + right) / 2 - (insets.left - insets.right) / 2 / pxPerMm,
      (bottom + top) / 2 + (insets.top - insets.bottom) / 2 / pxPerMm,
    ],
    pxPerMm,
  };
}

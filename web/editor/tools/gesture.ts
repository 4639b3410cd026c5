import type { Point } from '#core/board/outline.ts';
import type { ScreenPoint } from '../camera.ts';
import type { ObjectKey } from '#core/board/object-key.ts';

/** What the hand is doing. Every phase but `idle` is left by Escape without a trace. */
export type Gesture =
  | { phase: 'idle' }
  /** Pressed, not yet moved: becomes a click or a drag. */
  | { phase: 'pressed'; at: Point; screen: ScreenPoint; key: ObjectKey | null; extend: boolean }
  | { phase: 'corner-pressed'; at: Point; screen: ScreenPoint; key: ObjectKey; index: number }
  /** `held`: with the button down, ends on release; otherwise picked up, ends with the next click. */
  | { phase: 'moving'; from: Point; by: Point; keys: readonly ObjectKey[]; held: boolean }
  | { phase: 'moving-corner'; key: ObjectKey; index: number; to: Point; held: boolean }
  | { phase: 'marquee'; from: Point; to: Point; extend: boolean }
  | { phase: 'panning'; last: ScreenPoint }
  /** Corners set so far, and the place of the next one. */
  | { phase: 'polygon'; points: readonly Point[]; to: Point; pressed: boolean }
  /** First corner set; `held`: drawn with the button down. */
  | { phase: 'rectangle'; from: Point; to: Point; held: boolean; pressed: boolean }
  /** Pressed with something to be placed. */
  | { phase: 'placing'; at: Point };

export const idle: Gesture = { phase: 'idle' };

/** A press, move or release, with its place on the board. */
export type PointerInput = {
  /** Exact place, mm. */
  at: Point;
  /** Place on a near line of an object, else on the snap grid; the exact one while Alt suspends snapping, mm. */
  snapped: Point;
  /** Puts another place on the grid, as far as the grid counts now. */
  settle: (at: Point) => Point;
  /** Distance within which lines of objects draw, mm; null where they do not. */
  drawnWithinMm: number | null;
  screen: ScreenPoint;
  /** Adds to the selection. */
  shift: boolean;
  pxPerMm: number;
  /** False where the pointer has left the canvas: a release there cancels. */
  inside: boolean;
};

/** Movement below this is a click, px. */
export const dragThresholdPx = 4;
/** A click counts this far beside a small object, px; targets are 24 px wide at least. */
export const reachPx = 12;

export function movedFar(from: ScreenPoint, to: ScreenPoint): boolean {
  return Math.hypot(to[0] - from[0], to[1] - from[1]) >= dragThresholdPx;
}

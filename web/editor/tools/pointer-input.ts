import type { Point } from '#core/board/outline.ts';
import { type ScreenPoint, toBoard, toScreen } from '../camera.ts';
import type { EditorState } from '../editor-store.ts';
import { snapped } from '../grid.ts';
import { tidyMm } from '#core/board/edits/tidy-mm.ts';
import type { PointerInput } from './gesture.ts';

type Keys = { shift: boolean; alt: boolean };

/** A pointer on the canvas as a tool sees it. */
export function pointerInput(state: EditorState, screen: ScreenPoint, keys: Keys): PointerInput {
  const { camera, view } = state;
  const inside = screen[0] >= 0 && screen[1] >= 0 && screen[0] <= view.width && screen[1] <= view.height;
  return inputAt(state, toBoard(camera, view, screen), screen, inside, keys);
}

/** The crosshair as a tool sees it. */
export function crosshairInput(state: EditorState, at: Point, keys: Keys): PointerInput {
  // The arrow keys have put it where it is wanted; snapping it again would undo a fine step.
  return inputAt(state, at, toScreen(state.camera, state.view, at), true, { ...keys, alt: true });
}

function inputAt(
  { camera, gridMm, snapping }: EditorState,
  at: Point,
  screen: ScreenPoint,
  inside: boolean,
  keys: Keys,
): PointerInput {
  const exact = ([x, y]: Point): Point => [tidyMm(x), tidyMm(y)];
  const settle = snapping && !keys.alt ? (point: Point) => snapped(point, gridMm) : exact;
  return { at, snapped: settle(at), settle, screen, shift: keys.shift, pxPerMm: camera.pxPerMm, inside };
}

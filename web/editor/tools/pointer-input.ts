import type { Point } from '#core/board/outline.ts';
import { type ScreenPoint, toBoard, toScreen } from '../camera.ts';
import type { EditorState } from '../editor-store.ts';
import { snapped } from '../grid.ts';
import { tidyMm } from '#core/board/edits/tidy-mm.ts';
import { type SnapLine, snapLines } from '../snap/snap-lines.ts';
import { snapPoint, snapReachPx } from '../snap/snap-shift.ts';
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

function inputAt(state: EditorState, at: Point, screen: ScreenPoint, inside: boolean, keys: Keys): PointerInput {
  const { camera, gridMm, snapping, objectSnapping } = state;
  const exact = ([x, y]: Point): Point => [tidyMm(x), tidyMm(y)];
  const settle = snapping && !keys.alt ? (point: Point) => snapped(point, gridMm) : exact;
  const drawnWithinMm = objectSnapping && !keys.alt ? snapReachPx / camera.pxPerMm : null;
  const place = drawnWithinMm === null ? settle(at) : snapPoint(at, linesFor(state), drawnWithinMm, settle);
  return {
    at,
    snapped: place,
    settle,
    drawnWithinMm,
    screen,
    shift: keys.shift,
    pxPerMm: camera.pxPerMm,
    inside,
  };
}

/** Lines that draw the point under the hand; a shape whose corner is moved does not draw itself. */
export function linesFor({ board, gesture }: EditorState): readonly SnapLine[] {
  const own = gesture.phase === 'moving-corner' || gesture.phase === 'corner-pressed' ? [gesture.key] : [];
  return snapLines(board, own);
}

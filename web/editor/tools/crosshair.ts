import type { Point } from '#core/board/outline.ts';
import { type EditorStore } from '../editor-store.ts';
import { nudgeStep } from '../grid.ts';
import { tidyMm } from '#core/board/edits/tidy-mm.ts';
import { crosshairInput } from './pointer-input.ts';
import { toolOf } from './tool-of.ts';

export type ArrowKey = 'ArrowLeft' | 'ArrowRight' | 'ArrowUp' | 'ArrowDown';
type Keys = { shift: boolean; alt: boolean };

const directions: Record<ArrowKey, Point> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};

/** Step of an arrow key on the board, mm. */
export function arrowStep(key: ArrowKey, gridMm: number, keys: Keys): Point {
  const step = nudgeStep(gridMm, keys);
  return [directions[key][0] * step, directions[key][1] * step];
}

/** Moves the crosshair (it appears in the middle of the picture) and lets the tool follow. */
export function moveCrosshair(store: EditorStore, key: ArrowKey, keys: Keys): void {
  const state = store.getState();
  const [dx, dy] = arrowStep(key, state.gridMm, keys);
  const from = state.crosshair ?? crosshairInput(state, startOf(state), keys).at;
  const at: Point = state.crosshair ? [tidyMm(from[0] + dx), tidyMm(from[1] + dy)] : from;
  store.setState({ crosshair: at, pointer: null });
  toolOf(state).move(store, crosshairInput(store.getState(), at, keys));
}

/** A whole click at the crosshair. */
export function clickAtCrosshair(store: EditorStore, keys: Keys): void {
  const { crosshair } = store.getState();
  if (!crosshair) return;
  const tool = toolOf(store.getState());
  tool.press(store, crosshairInput(store.getState(), crosshair, keys));
  tool.release(store, crosshairInput(store.getState(), crosshair, keys));
}

/** Middle of the picture on the grid. */
function startOf({ camera, gridMm, gesture }: ReturnType<EditorStore['getState']>): Point {
  if (gesture.phase === 'moving') return [gesture.from[0] + gesture.by[0], gesture.from[1] + gesture.by[1]];
  if (gesture.phase === 'moving-corner') return gesture.to;
  const [x, y] = camera.centreMm;
  return [tidyMm(Math.round(x / gridMm) * gridMm), tidyMm(Math.round(y / gridMm) * gridMm)];
}

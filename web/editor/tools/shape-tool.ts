import { addCutout } from '#core/board/edits/add-cutout.ts';
import { addHole } from '#core/board/edits/add-hole.ts';
import { addPour } from '#core/board/edits/add-pour.ts';
import { setOutline } from '#core/board/edits/set-outline.ts';
import type { Point, Ring } from '#core/board/outline.ts';
import { type EditorStore, commit } from '../editor-store.ts';
import { rectangleBetween } from '#core/board/footprint.ts';
import { freeId } from '#core/board/free-id.ts';
import { idOf, kindOf, objectKey } from '#core/board/object-key.ts';
import { type PointerInput, idle, movedFar, reachPx } from './gesture.ts';
import type { Tool } from './tool.ts';

/** Rings of corners: a rectangle by two corners (dragged or clicked), a polygon by clicks. */
export const shapeTool: Tool = { press, move, release, finish };

function press(store: EditorStore, input: PointerInput): void {
  const { gesture, toolSettings } = store.getState();
  if (gesture.phase === 'polygon' || gesture.phase === 'rectangle') {
    store.setState({ gesture: { ...gesture, to: input.snapped, pressed: true } });
  } else if (toolSettings.shape === 'rectangle') {
    store.setState({
      gesture: { phase: 'rectangle', from: input.snapped, to: input.snapped, held: true, pressed: true },
    });
  } else {
    store.setState({ gesture: { phase: 'polygon', points: [], to: input.snapped, pressed: true } });
  }
}

function move(store: EditorStore, input: PointerInput): void {
  const { gesture } = store.getState();
  if (gesture.phase === 'polygon' || gesture.phase === 'rectangle') {
    store.setState({ gesture: { ...gesture, to: input.snapped } });
  }
}

function release(store: EditorStore, input: PointerInput): void {
  const { gesture } = store.getState();
  if (gesture.phase === 'rectangle') return releaseRectangle(store, gesture, input);
  if (gesture.phase !== 'polygon' || !gesture.pressed) return;
  if (!input.inside) return store.setState({ gesture: { ...gesture, pressed: false } });
  const [first] = gesture.points;
  const last = gesture.points.at(-1);
  const closes = first && gesture.points.length >= 3 && isNear(first, input.snapped, input.pxPerMm);
  if (closes || (last && gesture.points.length >= 3 && same(last, input.snapped))) return finish(store);
  const points = last && same(last, input.snapped) ? gesture.points : [...gesture.points, input.snapped];
  store.setState({ gesture: { phase: 'polygon', points, to: input.snapped, pressed: false } });
}

function releaseRectangle(
  store: EditorStore,
  gesture: { from: Point; to: Point; held: boolean },
  input: PointerInput,
): void {
  if (!input.inside) return store.setState({ gesture: idle });
  const to = input.snapped;
  const spans = to[0] !== gesture.from[0] && to[1] !== gesture.from[1];
  const px = (mm: Point) => [mm[0] * input.pxPerMm, mm[1] * input.pxPerMm] as const;
  // A click sets the first corner only; the second click (or the end of a drag) sets the other.
  if (!spans || (gesture.held && !movedFar(px(gesture.from), px(to)))) {
    store.setState({ gesture: { phase: 'rectangle', from: gesture.from, to, held: false, pressed: false } });
    return;
  }
  commitRing(store, rectangleBetween(gesture.from, to));
}

/** Closes the polygon with the corners set so far; with fewer than three there is nothing to close. */
function finish(store: EditorStore): void {
  const { gesture } = store.getState();
  if (gesture.phase === 'polygon' && gesture.points.length >= 3) commitRing(store, [...gesture.points]);
}

function commitRing(store: EditorStore, ring: Ring): void {
  const { tool, board, selection, activeLayer, toolSettings } = store.getState();
  if (tool === 'outline') return commit(store, 'Draw the outline', (before) => setOutline(before, ring));
  if (tool === 'pour') {
    const id = freeId(
      'p',
      board.pours.map((pour) => pour.id),
    );
    const pour = {
      id,
      layer: activeLayer,
      net: toolSettings.net,
      points: ring,
      holes: [],
      coverage: 1,
      emissivity: null,
    };
    commit(store, `Draw pour ${id}`, (before) => addPour(before, pour));
    store.setState({ selection: [objectKey('pour', id)] });
    return;
  }
  const [only] = selection;
  if (only && selection.length === 1 && kindOf(only) === 'pour') {
    return commit(store, `Cut a hole in pour ${idOf(only)}`, (before) => addHole(before, idOf(only), ring));
  }
  commit(store, 'Draw a cut-out', (before) => addCutout(before, ring));
}

function same(a: Point, b: Point): boolean {
  return a[0] === b[0] && a[1] === b[1];
}

function isNear(a: Point, b: Point, pxPerMm: number): boolean {
  return Math.hypot(a[0] - b[0], a[1] - b[1]) * pxPerMm <= reachPx;
}

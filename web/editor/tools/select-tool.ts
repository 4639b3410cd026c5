import { moveObjects } from '#core/board/edits/move-objects.ts';
import { moveCorner } from '#core/board/edits/move-corner.ts';
import type { Board } from '#core/board/document.ts';
import type { Point } from '#core/board/outline.ts';
import { type EditorStore, commit } from '../editor-store.ts';
import { rectangleBetween } from '#core/board/footprint.ts';
import { tidyMm } from '#core/board/edits/tidy-mm.ts';
import { cornerAt, objectAt, objectsWithin } from '../hit.ts';
import { type ObjectKey, objectKeys, objectName } from '#core/board/object-key.ts';
import { boxOf, positionOf } from '#core/board/object-rings.ts';
import { linesOf, snapLines } from '../snap/snap-lines.ts';
import { snapShift } from '../snap/snap-shift.ts';
import { type Gesture, type PointerInput, idle, movedFar, reachPx } from './gesture.ts';
import type { Tool } from './tool.ts';

/** Click selects, drag moves, a drag from empty ground spans a marquee; corners of a selected polygon move alone. */
export const selectTool: Tool = { press, move, release };

function press(store: EditorStore, input: PointerInput): void {
  const { board, activeLayer, selection, gesture, readOnly } = store.getState();
  // A second click puts down what was picked up; `release` does it.
  if (gesture.phase === 'moving' || gesture.phase === 'moving-corner') return;
  const reachMm = reachPx / input.pxPerMm;
  const corner = readOnly === null ? cornerAt(board, selection, input.at, reachMm) : null;
  if (corner) {
    store.setState({ gesture: { phase: 'corner-pressed', at: input.at, screen: input.screen, ...corner } });
    return;
  }
  const key = objectAt(board, activeLayer, input.at, reachMm / 2);
  store.setState({ gesture: { phase: 'pressed', at: input.at, screen: input.screen, key, extend: input.shift } });
}

function move(store: EditorStore, input: PointerInput): void {
  const { gesture, readOnly } = store.getState();
  switch (gesture.phase) {
    case 'pressed':
      if (movedFar(gesture.screen, input.screen)) startDrag(store, gesture, input, readOnly === null);
      return;
    case 'corner-pressed':
      if (movedFar(gesture.screen, input.screen)) dragCorner(store, gesture.key, gesture.index, input, true);
      return;
    case 'moving-corner':
      return dragCorner(store, gesture.key, gesture.index, input, gesture.held);
    case 'moving':
      return carry(store, gesture, input);
    case 'marquee':
      return store.setState({ gesture: { ...gesture, to: input.at } });
    default:
  }
}

function release(store: EditorStore, input: PointerInput): void {
  const { gesture, live } = store.getState();
  switch (gesture.phase) {
    case 'pressed':
      return click(store, gesture.key, gesture.extend);
    case 'corner-pressed':
      // A click on a corner picks it up; the next click puts it down.
      return store.setState({
        gesture: { phase: 'moving-corner', key: gesture.key, index: gesture.index, to: gesture.at, held: false },
      });
    case 'moving': {
      if (!input.inside && gesture.held) return store.setState({ gesture: idle, live: null });
      carry(store, gesture, input);
      const settled = store.getState().live ?? live;
      return commit(store, `Move ${named(gesture.keys)}`, (board) => settled ?? board);
    }
    case 'moving-corner': {
      if (!input.inside && gesture.held) return store.setState({ gesture: idle, live: null });
      dragCorner(store, gesture.key, gesture.index, input, gesture.held);
      const settled = store.getState().live;
      return commit(store, `Move a corner of ${objectName(gesture.key)}`, (board) => settled ?? board);
    }
    case 'marquee':
      return spanned(store, gesture);
    default:
  }
}

function click(store: EditorStore, key: ObjectKey | null, extend: boolean): void {
  const { selection } = store.getState();
  const toggled = () => {
    if (!key) return selection;
    return selection.includes(key) ? selection.filter((other) => other !== key) : [...selection, key];
  };
  store.setState({ gesture: idle, selection: extend ? toggled() : key ? [key] : [] });
}

function startDrag(
  store: EditorStore,
  gesture: Extract<Gesture, { phase: 'pressed' }>,
  input: PointerInput,
  mayEdit: boolean,
): void {
  const { selection } = store.getState();
  // The outline is not dragged by accident: it moves by its corners or by M.
  if (!gesture.key || gesture.key.startsWith('outline') || !mayEdit) {
    store.setState({ gesture: { phase: 'marquee', from: gesture.at, to: input.at, extend: gesture.extend } });
    return;
  }
  const keys = selection.includes(gesture.key) ? selection : [gesture.key];
  store.setState({ selection: keys });
  carry(store, { phase: 'moving', from: gesture.at, by: [0, 0], keys, held: true }, input);
}

/** Picks the selection up for a move by clicks or arrow keys. */
export function pickUp(store: EditorStore): void {
  const { selection, board, pointer, readOnly } = store.getState();
  const [first] = selection;
  const from = first && (pointer ?? positionOf(board, first));
  if (!from || readOnly !== null) return;
  store.setState({ tool: 'select', gesture: { phase: 'moving', from, by: [0, 0], keys: selection, held: false } });
}

/**
 * Edges, centres and lands of what is moved are drawn to those of other objects; where none is near, its reference
 * point lands on the grid, so that a part lies where its figures are round.
 */
function carry(store: EditorStore, gesture: Extract<Gesture, { phase: 'moving' }>, input: PointerInput): void {
  const { board, live: before } = store.getState();
  const [first] = gesture.keys;
  const home = (first && positionOf(board, first)) ?? gesture.from;
  const exact: Point = [input.at[0] - gesture.from[0], input.at[1] - gesture.from[1]];
  const by = input.settle([home[0] + exact[0], home[1] + exact[1]]);
  const [drawnX, drawnY] = drawn(board, gesture.keys, exact, input.drawnWithinMm);
  const shift: Point = [
    tidyMm(drawnX === null ? by[0] - home[0] : exact[0] + drawnX),
    tidyMm(drawnY === null ? by[1] - home[1] : exact[1] + drawnY),
  ];
  // Within one step of the grid nothing has changed; a new board would be calculated for nothing.
  if (before && shift[0] === gesture.by[0] && shift[1] === gesture.by[1]) return;
  const live = shift[0] === 0 && shift[1] === 0 ? board : moveObjects(board, gesture.keys, shift);
  store.setState({ gesture: { ...gesture, by: shift }, live });
}

/** What lines of other objects add to a move by the hand, per axis; null where none is near. */
function drawn(
  board: Board,
  keys: readonly ObjectKey[],
  [dx, dy]: Point,
  withinMm: number | null,
): [number | null, number | null] {
  if (withinMm === null) return [null, null];
  const moving = keys
    .flatMap((key) => linesOf(board, key))
    .map((line) => ({ axis: line.axis, at: line.at + (line.axis === 0 ? dx : dy) }));
  return snapShift(moving, snapLines(board, keys), withinMm);
}

function dragCorner(store: EditorStore, key: ObjectKey, index: number, input: PointerInput, held: boolean): void {
  const { board, gesture, live } = store.getState();
  const [x, y] = input.snapped;
  if (live && gesture.phase === 'moving-corner' && gesture.to[0] === x && gesture.to[1] === y) return;
  store.setState({
    gesture: { phase: 'moving-corner', key, index, to: input.snapped, held },
    live: moveCorner(board, key, index, input.snapped),
  });
}

function spanned(store: EditorStore, gesture: Extract<Gesture, { phase: 'marquee' }>): void {
  const { board, selection } = store.getState();
  const box = boxOf([rectangleBetween(gesture.from, gesture.to)]);
  const found = box ? objectsWithin(board, objectKeys(board), box) : [];
  store.setState({
    gesture: idle,
    selection: gesture.extend ? [...new Set([...selection, ...found])] : found,
  });
}

export function named(keys: readonly ObjectKey[]): string {
  const [first] = keys;
  return keys.length === 1 && first ? objectName(first) : `${keys.length} objects`;
}

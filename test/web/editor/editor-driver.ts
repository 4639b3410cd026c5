import { boardDocument } from '#core/board/document.ts';
import { toScreen } from '#web/editor/camera.ts';
import { commands } from '#web/editor/commands/command.ts';
import { type EditorStore, createEditorStore } from '#web/editor/editor-store.ts';
import { cancelGesture } from '#web/editor/tools/cancel-gesture.ts';
import { type ArrowKey, clickAtCrosshair, moveCrosshair } from '#web/editor/tools/crosshair.ts';
import { pointerInput } from '#web/editor/tools/pointer-input.ts';
import { toolOf } from '#web/editor/tools/tool-of.ts';
import type { ToolName } from '#web/editor/tools/tool-name.ts';
import { nudge } from '#web/editor/commands/nudge.ts';
import { smallDocument } from '#test/core/board/small-board.ts';

type Mm = readonly [number, number];
type Keys = { shift?: boolean; alt?: boolean };

/** The real store with a scripted hand: places are given in mm, 10 px per mm, on a grid of 1 mm; lines of objects draw where asked for. */
export function driveEditor(readOnly: string | null = null, objectSnapping = false) {
  const store: EditorStore = createEditorStore({
    board: boardDocument.parse(smallDocument),
    version: 1,
    savedAt: '2026-03-01T10:00:00.000Z',
    readOnly,
  });
  store.setState({
    view: { width: 800, height: 600 },
    camera: { centreMm: [20, 15], pxPerMm: 10 },
    gridMm: 1,
    objectSnapping,
  });
  const keysOf = ({ shift = false, alt = false }: Keys) => ({ shift, alt });
  const input = (at: Mm, keys: Keys) => {
    const state = store.getState();
    return pointerInput(state, toScreen(state.camera, state.view, at), keysOf(keys));
  };
  const hand = {
    store,
    tool: (tool: ToolName) => store.setState({ tool }),
    press: (at: Mm, keys: Keys = {}) => toolOf(store.getState()).press(store, input(at, keys)),
    move: (at: Mm, keys: Keys = {}) => toolOf(store.getState()).move(store, input(at, keys)),
    release: (at: Mm, keys: Keys = {}) => toolOf(store.getState()).release(store, input(at, keys)),
    click(at: Mm, keys: Keys = {}) {
      hand.press(at, keys);
      hand.release(at, keys);
    },
    drag(from: Mm, to: Mm, keys: Keys = {}) {
      hand.press(from, keys);
      hand.move([(from[0] + to[0]) / 2, (from[1] + to[1]) / 2], keys);
      hand.move(to, keys);
      hand.release(to, keys);
    },
    finish: () => toolOf(store.getState()).finish?.(store),
    escape: () => cancelGesture(store),
    undo: () => commands.undo.run(store),
    redo: () => commands.redo.run(store),
    crosshair: (key: ArrowKey, keys: Keys = {}) => moveCrosshair(store, key, keysOf(keys)),
    enter: (keys: Keys = {}) => clickAtCrosshair(store, keysOf(keys)),
    nudge: (key: ArrowKey, keys: Keys = {}) => nudge(store, key, keysOf(keys)),
    board: () => store.getState().board,
    steps: () => store.getState().history.undo.map((step) => step.name),
    selection: () => store.getState().selection,
    phase: () => store.getState().gesture.phase,
  };
  return hand;
}

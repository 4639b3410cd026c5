import { createStore, type StoreApi } from 'zustand/vanilla';
import type { Board } from '#core/board/document.ts';
import type { Point } from '#core/board/outline.ts';
import type { Camera, ViewSize } from './camera.ts';
import { type History, noHistory, recorded, redone, undone } from './history.ts';
import { type ObjectKey, hasObject } from '#core/board/object-key.ts';
import type { SaveState } from './saving/save-state.ts';
import { type Checks, noChecks } from './solve/checks.ts';
import { type Gesture, idle } from './tools/gesture.ts';
import { type ToolName, type ToolSettings, firstSettings } from './tools/tool-name.ts';

/** What the pictures show: the board's copper, its heat, or both. */
export type Shown = 'heat' | 'copper';

export type EditorState = {
  /** The board after the last step. */
  board: Board;
  /** The board while a gesture is under way; becomes a step when the gesture ends, nothing when it is cancelled. */
  live: Board | null;
  history: History;
  selection: readonly ObjectKey[];
  tool: ToolName;
  toolSettings: ToolSettings;
  gesture: Gesture;
  /** Where the arrow keys have put the crosshair, mm; null while the pointer is used. */
  crosshair: Point | null;
  /** Where the pointer is, mm; null while it is off the canvas. */
  pointer: Point | null;
  camera: Camera;
  view: ViewSize;
  activeLayer: string;
  activeCondition: string | null;
  shown: Shown;
  gridMm: number;
  /** Places land on the grid. */
  snapping: boolean;
  /** Places are drawn to lines of other objects. */
  objectSnapping: boolean;
  /** Why nothing can be changed; null where the sketch may be edited. */
  readOnly: string | null;
  savedBoard: Board;
  savedVersion: number;
  savedAt: string;
  save: SaveState;
  checks: Checks;
};

export type EditorStore = StoreApi<EditorState>;

type Opening = { board: Board; version: number; savedAt: string; readOnly: string | null };

/** The editor's whole state, without React. Boards in it are never changed in place. */
export function createEditorStore({ board, version, savedAt, readOnly }: Opening): EditorStore {
  return createStore<EditorState>(() => ({
    board,
    live: null,
    history: noHistory,
    selection: [],
    tool: 'select',
    toolSettings: firstSettings,
    gesture: idle,
    crosshair: null,
    pointer: null,
    camera: { centreMm: [0, 0], pxPerMm: 8 },
    view: { width: 0, height: 0 },
    activeLayer: board.stackup.copper[0]?.name ?? '',
    activeCondition: board.conditions[0]?.name ?? null,
    shown: 'heat',
    gridMm: 0.5,
    snapping: true,
    objectSnapping: true,
    readOnly,
    savedBoard: board,
    savedVersion: version,
    savedAt,
    save: { kind: 'saved', at: savedAt },
    checks: noChecks,
  }));
}

/** The board to be drawn: with the gesture that is under way. */
export function shownBoard(state: Pick<EditorState, 'board' | 'live'>): Board {
  return state.live ?? state.board;
}

/** Makes one named step of an edit; an edit that changes nothing makes none. Ends whatever gesture is under way. */
export function commit(store: EditorStore, name: string, edit: (board: Board) => Board): void {
  const state = store.getState();
  if (state.readOnly !== null) return;
  const next = edit(state.board);
  const ended = { live: null, gesture: idle };
  if (next === state.board) return store.setState(ended);
  // In one go: nobody must see the old board between the gesture and the step.
  store.setState({ ...ended, ...kept(state, next), history: recorded(state.history, name, state.board) });
}

/** @returns name of the step that was taken back; null when there was none */
export function undo(store: EditorStore): string | null {
  return travel(store, undone);
}

/** @returns name of the step that was done again; null when there was none */
export function redo(store: EditorStore): string | null {
  return travel(store, redone);
}

function travel(store: EditorStore, way: typeof undone): string | null {
  const state = store.getState();
  if (state.readOnly !== null) return null;
  const step = way(state.history, state.board);
  if (!step) return null;
  store.setState({ ...kept(state, step.board), history: step.history, live: null, gesture: idle });
  return step.name;
}

/** Selection, layer and condition follow the board: what is gone from it cannot stay chosen. */
function kept(state: EditorState, board: Board): Partial<EditorState> {
  const layers = board.stackup.copper;
  const isLayer = layers.some((layer) => layer.name === state.activeLayer);
  const isCondition = board.conditions.some((condition) => condition.name === state.activeCondition);
  return {
    board,
    selection: state.selection.filter((key) => hasObject(board, key)),
    activeLayer: isLayer ? state.activeLayer : (layers[0]?.name ?? ''),
    activeCondition: isCondition ? state.activeCondition : (board.conditions[0]?.name ?? null),
  };
}

/** Takes another starting board, e.g. one that somebody else saved; the present one stays on the undo stack. */
export function adopt(store: EditorStore, name: string, board: Board, version: number, savedAt: string): void {
  const state = store.getState();
  store.setState({
    ...kept(state, board),
    history: recorded(state.history, name, state.board),
    live: null,
    gesture: idle,
    savedBoard: board,
    savedVersion: version,
    savedAt,
    save: { kind: 'saved', at: savedAt },
  });
}

export function isDirty(state: Pick<EditorState, 'board' | 'savedBoard'>): boolean {
  return state.board !== state.savedBoard;
}

/** Steps between the board that the server has and the present one. */
export function changesSinceSave({ board, savedBoard, history }: EditorState): number {
  if (board === savedBoard) return 0;
  const done = history.undo.findLastIndex((step) => step.board === savedBoard);
  if (done >= 0) return history.undo.length - done;
  const takenBack = history.redo.findLastIndex((step) => step.board === savedBoard);
  return takenBack >= 0 ? history.redo.length - takenBack : Math.max(1, history.undo.length);
}

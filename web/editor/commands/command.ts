import { deleteObjects } from '#core/board/edits/delete-objects.ts';
import { duplicateObjects } from '#core/board/edits/duplicate-objects.ts';
import { rotateObjects } from '#core/board/edits/rotate-objects.ts';
import { announce } from '#web/ui/announce.ts';
import { type EditorState, type EditorStore, commit, redo, undo } from '../editor-store.ts';
import { fitBoard, zoomBy } from '../fit.ts';
import { objectKeys } from '#core/board/object-key.ts';
import { named, pickUp } from '../tools/select-tool.ts';
import { type ToolName, toolNames, toolWords } from '../tools/tool-name.ts';

/** One act of the editor; its button, its key and the list of keys all come from here. */
export type Command = {
  id: string;
  label: string;
  /** Keys as they are pressed: "Ctrl+Z", "R". */
  keys: readonly string[];
  may: (state: EditorState) => boolean;
  run: (store: EditorStore) => void;
};

const mayEdit = (state: EditorState) => state.readOnly === null;
const hasSelection = (state: EditorState) => mayEdit(state) && state.selection.some((key) => key !== 'outline:');
const always = () => true;

export const commands = {
  undo: {
    id: 'undo',
    label: 'Undo',
    keys: ['Ctrl+Z'],
    may: (state) => mayEdit(state) && state.history.undo.length > 0,
    run: (store) => told(undo(store), 'Undone'),
  },
  redo: {
    id: 'redo',
    label: 'Redo',
    keys: ['Ctrl+Shift+Z', 'Ctrl+Y'],
    may: (state) => mayEdit(state) && state.history.redo.length > 0,
    run: (store) => told(redo(store), 'Done again'),
  },
  rotate: {
    id: 'rotate',
    label: 'Rotate by 90°',
    keys: ['R'],
    may: hasSelection,
    run: (store) => rotate(store, 90),
  },
  rotateBack: {
    id: 'rotate-back',
    label: 'Rotate back by 90°',
    keys: ['Shift+R'],
    may: hasSelection,
    run: (store) => rotate(store, -90),
  },
  pickUp: {
    id: 'pick-up',
    label: 'Pick up to move by clicks',
    keys: ['M'],
    may: (state) => mayEdit(state) && state.selection.length > 0,
    run: pickUp,
  },
  duplicate: {
    id: 'duplicate',
    label: 'Duplicate',
    keys: ['Ctrl+D'],
    may: hasSelection,
    run: duplicate,
  },
  delete: {
    id: 'delete',
    label: 'Delete',
    keys: ['Delete', 'Backspace'],
    may: hasSelection,
    run: remove,
  },
  selectAll: {
    id: 'select-all',
    label: 'Select all',
    keys: ['Ctrl+A'],
    may: always,
    run: (store) =>
      store.setState(({ board }) => ({ selection: objectKeys(board).filter((key) => key !== 'outline:') })),
  },
  zoomIn: { id: 'zoom-in', label: 'Zoom in', keys: ['+', '='], may: always, run: (store) => zoomBy(store, 1.25) },
  zoomOut: { id: 'zoom-out', label: 'Zoom out', keys: ['-'], may: always, run: (store) => zoomBy(store, 0.8) },
  fit: { id: 'fit', label: 'Fit the board', keys: ['0'], may: always, run: fitBoard },
  heat: {
    id: 'heat',
    label: 'Heat or copper',
    keys: ['B'],
    may: always,
    run: (store) => store.setState(({ shown }) => ({ shown: shown === 'heat' ? 'copper' : 'heat' })),
  },
  snap: {
    id: 'snap',
    label: 'Snap to the grid',
    keys: ['G'],
    may: always,
    run: (store) => store.setState(({ snapping }) => ({ snapping: !snapping })),
  },
  objectSnap: {
    id: 'object-snap',
    label: 'Snap to objects',
    keys: ['Shift+G'],
    may: always,
    run: (store) => store.setState(({ objectSnapping }) => ({ objectSnapping: !objectSnapping })),
  },
} satisfies Record<string, Command>;

export const toolCommands: readonly Command[] = toolNames.map((tool) => ({
  id: `tool-${tool}`,
  label: toolWords[tool].label,
  keys: [toolWords[tool].key.toUpperCase()],
  may: (state) => mayEdit(state) || tool === 'select' || tool === 'hand',
  run: (store) => chooseTool(store, tool),
}));

export const allCommands: readonly Command[] = [...toolCommands, ...Object.values<Command>(commands)];

export function chooseTool(store: EditorStore, tool: ToolName): void {
  store.setState({ tool, gesture: { phase: 'idle' }, live: null, crosshair: null });
}

function rotate(store: EditorStore, byDeg: number): void {
  const { selection } = store.getState();
  commit(store, `Rotate ${named(selection)}`, (board) => rotateObjects(board, selection, byDeg));
}

function duplicate(store: EditorStore): void {
  const { selection, board, gridMm } = store.getState();
  const step = Math.max(gridMm, 2);
  const copy = duplicateObjects(board, selection, [step, -step]);
  commit(store, `Duplicate ${named(selection)}`, () => copy.board);
  store.setState({ selection: copy.keys });
}

function remove(store: EditorStore): void {
  const { selection } = store.getState();
  const name = `Delete ${named(selection)}`;
  commit(store, name, (board) => deleteObjects(board, selection));
  announce(`${name}. Ctrl Z takes it back.`);
}

function told(name: string | null, word: string): void {
  if (name) announce(`${word}: ${name}`);
}

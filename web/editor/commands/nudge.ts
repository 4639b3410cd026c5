import { moveObjects } from '#core/board/edits/move-objects.ts';
import { type EditorStore, commit } from '../editor-store.ts';
import { type ArrowKey, arrowStep } from '../tools/crosshair.ts';
import { named } from '../tools/select-tool.ts';

/** Moves the selection by one step of the arrow keys. */
export function nudge(store: EditorStore, key: ArrowKey, keys: { shift: boolean; alt: boolean }): void {
  const { selection, gridMm } = store.getState();
  const by = arrowStep(key, gridMm, keys);
  commit(store, `Nudge ${named(selection)}`, (board) => moveObjects(board, selection, by));
}

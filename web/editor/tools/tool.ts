import type { EditorStore } from '../editor-store.ts';
import type { PointerInput } from './gesture.ts';

/**
 * One tool as a small state machine over the store's gesture. `press` alone never changes the board;
 * Escape is handled for all of them in `cancelGesture`.
 */
export type Tool = {
  press: (store: EditorStore, input: PointerInput) => void;
  move: (store: EditorStore, input: PointerInput) => void;
  release: (store: EditorStore, input: PointerInput) => void;
  /** Double click, or Enter on the place of the last corner. */
  finish?: (store: EditorStore) => void;
};

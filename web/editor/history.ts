import type { Board } from '#core/board/document.ts';

/** One undoable step: what was done, and the board as it was on the other side of it. */
export type Step = { name: string; board: Board };
/** Boards share what did not change, so a step costs little more than a reference. */
export type History = { undo: readonly Step[]; redo: readonly Step[] };

export const noHistory: History = { undo: [], redo: [] };
/** Steps that can be taken back. */
export const deepest = 500;

/** A new step was done; what had been taken back before is gone. */
export function recorded(history: History, name: string, before: Board): History {
  return { undo: [...history.undo.slice(1 - deepest), { name, board: before }], redo: [] };
}

/** @returns the board before the last step; null when there is nothing to take back */
export function undone(history: History, present: Board): { history: History; board: Board; name: string } | null {
  const step = history.undo.at(-1);
  if (!step) return null;
  return {
    board: step.board,
    name: step.name,
    history: { undo: history.undo.slice(0, -1), redo: [...history.redo, { name: step.name, board: present }] },
  };
}

/** @returns the board after the step that was taken back last; null when there is none */
export function redone(history: History, present: Board): { history: History; board: Board; name: string } | null {
  const step = history.redo.at(-1);
  if (!step) return null;
  return {
    board: step.board,
    name: step.name,
    history: { undo: [...history.undo, { name: step.name, board: present }], redo: history.redo.slice(0, -1) },
  };
}

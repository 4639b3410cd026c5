import type { Board } from '#core/board/document.ts';

/** A copy of a condition under a name of its own, right after it. The same board where the name is taken or nothing is to be copied. */
export function duplicateCondition(board: Board, name: string, copyName: string): Board {
  const index = board.conditions.findIndex((condition) => condition.name === name);
  const meant = board.conditions[index];
  if (!meant || board.conditions.some((condition) => condition.name === copyName)) return board;
  return { ...board, conditions: board.conditions.toSpliced(index + 1, 0, { ...meant, name: copyName }) };
}

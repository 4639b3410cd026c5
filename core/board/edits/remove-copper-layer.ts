import type { Board } from '#core/board/document.ts';

/** Takes a copper layer and the laminate below it (above it for the last one) out. The same board where it is the only layer. */
export function removeCopperLayer(board: Board, index: number): Board {
  const { copper, dielectric } = board.stackup;
  if (copper.length <= 1 || !copper[index]) return board;
  const laminate = Math.min(index, dielectric.length - 1);
  return {
    ...board,
    stackup: { ...board.stackup, copper: copper.toSpliced(index, 1), dielectric: dielectric.toSpliced(laminate, 1) },
  };
}

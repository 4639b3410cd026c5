import type { Board } from '#core/board/document.ts';
import type { PackageModel } from '#core/board/package.ts';
import type { Part } from '#core/board/part.ts';

/** Copies a part and its package from the library into the document; what the document has already stays as it is. */
export function addPart(board: Board, key: string, part: Part, model: PackageModel): Board {
  if (board.parts[key]) return board;
  return {
    ...board,
    parts: { ...board.parts, [key]: part },
    packages: board.packages[part.package] ? board.packages : { ...board.packages, [part.package]: model },
  };
}

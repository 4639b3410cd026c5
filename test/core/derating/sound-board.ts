import { type Board, type BoardDocument, boardDocument } from '#core/board/document.ts';
import { smallDocument } from '../board/small-board.ts';

/** The small board with a junction rule: nothing is found on it as it is. */
export function soundBoard(change: (document: BoardDocument) => void = () => undefined): Board {
  const rules = [{ quantity: 'junctionC' as const, belowMaxK: 25, source: 'tests' }];
  const document = structuredClone({ ...smallDocument, criteria: { name: 'Tests', rules } });
  change(document);
  return boardDocument.parse(document);
}

/** A square of 8 mm about a point. */
export function ringAt(x: number, y: number): [number, number][] {
  return [
    [x - 4, y - 4],
    [x + 4, y - 4],
    [x + 4, y + 4],
    [x - 4, y + 4],
  ];
}

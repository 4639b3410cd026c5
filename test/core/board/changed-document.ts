import type { BoardDocument } from '#core/board/document.ts';
import { smallDocument } from './small-board.ts';

/** A deep copy of the small document with something changed in place. */
export function changedDocument(change: (document: BoardDocument) => void): BoardDocument {
  const copy = structuredClone(smallDocument);
  change(copy);
  return copy;
}

import type { Criteria } from '#core/board/criteria.ts';
import type { Board } from '#core/board/document.ts';

/** Another derating rule set, copied into the document so that it never changes behind a revision. */
export function setCriteria(board: Board, criteria: Criteria): Board {
  return { ...board, criteria };
}

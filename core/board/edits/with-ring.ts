import type { Board } from '#core/board/document.ts';
import type { Ring } from '#core/board/outline.ts';
import { type ObjectKey, idOf, kindOf } from '../object-key.ts';
import { replaced } from './in-list.ts';

/** The board with the outer ring of a pour, a cut-out or the outline changed; others have no ring and stay. */
export function withRing(board: Board, key: ObjectKey, change: (ring: Ring) => Ring): Board {
  const id = idOf(key);
  switch (kindOf(key)) {
    case 'pour': {
      const pours = replaced(
        board.pours,
        (pour) => pour.id === id,
        (pour) => ({ ...pour, points: change(pour.points) }),
      );
      return pours === board.pours ? board : { ...board, pours };
    }
    case 'cutout': {
      const cutouts = board.outline.cutouts.map((ring, index) => (index === Number(id) ? change(ring) : ring));
      return { ...board, outline: { ...board.outline, cutouts } };
    }
    case 'outline':
      return { ...board, outline: { ...board.outline, points: change(board.outline.points) } };
    default:
      return board;
  }
}

import type { Board } from '#core/board/document.ts';
import type { DielectricLayer } from '#core/board/stackup.ts';

export function changeDielectric(board: Board, index: number, patch: Partial<DielectricLayer>): Board {
  const dielectric = board.stackup.dielectric.map((layer, place) => (place === index ? { ...layer, ...patch } : layer));
  return { ...board, stackup: { ...board.stackup, dielectric } };
}

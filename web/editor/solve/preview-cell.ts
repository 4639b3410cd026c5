import type { Board } from '#core/board/document.ts';

/** Unknowns at most: `preview` answers within about a tenth of a second, `refined` within about half a second. */
const unknowns = { preview: 6000, refined: 30_000 };
const finestMm = 0.75;

/** Cell of an answer that is wanted before the full one, mm. */
export function previewCellMm(board: Board, fidelity: keyof typeof unknowns): number {
  const xs = board.outline.points.map((point) => point[0]);
  const ys = board.outline.points.map((point) => point[1]);
  const areaMm2 = (Math.max(...xs) - Math.min(...xs)) * (Math.max(...ys) - Math.min(...ys));
  const cell = Math.sqrt((areaMm2 * board.stackup.copper.length) / unknowns[fidelity]);
  return Math.max(finestMm, Math.ceil(cell * 4) / 4);
}

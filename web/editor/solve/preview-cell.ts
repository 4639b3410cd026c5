import type { Board } from '#core/board/document.ts';

/** Unknowns of a preview, so that its answer comes within a tenth of a second. */
const unknowns = 6000;
const finestMm = 1;

/** Cell of the preview while something is being moved, mm. */
export function previewCellMm(board: Board): number {
  const xs = board.outline.points.map((point) => point[0]);
  const ys = board.outline.points.map((point) => point[1]);
  const areaMm2 = (Math.max(...xs) - Math.min(...xs)) * (Math.max(...ys) - Math.min(...ys));
  const cell = Math.sqrt((areaMm2 * board.stackup.copper.length) / unknowns);
  return Math.max(finestMm, Math.ceil(cell * 4) / 4);
}

import type { Board } from '#core/board/document.ts';
import type { BoardLayers } from './board-layers.ts';
import type { CellGrid } from './cell-grid.ts';
import { landCorrection, type LandCorrection } from './land-correction.ts';
import { placedLands } from './land-placement.ts';

/** A board with more lands than this goes without. */
export const mostCorrectedLands = 300;

/** Corrections of every land, by part and land name. */
export function landCorrections(
  board: Board,
  grid: CellGrid,
  layers: BoardLayers,
  resolvedMm: number,
): Map<string, Map<string, LandCorrection>> {
  const placed = board.regulators.map((regulator) => ({ regulator, lands: placedLands(board, regulator) }));
  const count = placed.reduce((sum, { lands }) => sum + lands.length, 0);
  if (count > mostCorrectedLands) return new Map();
  return new Map(
    placed.map(({ regulator, lands }) => [
      regulator.ref,
      new Map(lands.map((land) => [land.land.name, landCorrection(board, grid, layers, land, resolvedMm)])),
    ]),
  );
}

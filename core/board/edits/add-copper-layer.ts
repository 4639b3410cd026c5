import type { Board } from '#core/board/document.ts';
import { freeId } from '../free-id.ts';

const usualLaminate = { thicknessMm: 1.5, inPlaneWPerMK: 0.9, throughWPerMK: 0.3 };

/**
 * A bare copper layer below the one at `index` (the last when left out), as thick as that one, with a laminate like its
 * neighbour's between them.
 */
export function addCopperLayer(board: Board, index: number = board.stackup.copper.length - 1): Board {
  const { copper, dielectric } = board.stackup;
  const name = freeId(
    'L',
    copper.map((layer) => layer.name),
  );
  const layer = { name, thicknessUm: copper[index]?.thicknessUm ?? 35, plane: null, traces: null };
  const laminate = dielectric[index] ?? dielectric.at(-1) ?? usualLaminate;
  return {
    ...board,
    stackup: {
      ...board.stackup,
      copper: copper.toSpliced(index + 1, 0, layer),
      dielectric: dielectric.toSpliced(index, 0, laminate),
    },
  };
}

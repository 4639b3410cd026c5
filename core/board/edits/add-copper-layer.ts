import type { Board } from '#core/board/document.ts';
import { freeId } from '../free-id.ts';

/** A bare copper layer below the last one, with a laminate like the last between them. */
export function addCopperLayer(board: Board): Board {
  const { copper, dielectric } = board.stackup;
  const last = copper.at(-1);
  const name = freeId(
    'L',
    copper.map((layer) => layer.name),
  );
  return {
    ...board,
    stackup: {
      ...board.stackup,
      copper: [...copper, { name, thicknessUm: last?.thicknessUm ?? 35, plane: null, traces: null }],
      dielectric: [...dielectric, dielectric.at(-1) ?? { thicknessMm: 1.5, inPlaneWPerMK: 0.9, throughWPerMK: 0.3 }],
    },
  };
}

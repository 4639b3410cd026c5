import type { Board } from '#core/board/document.ts';

/** Node layers of the board, top to bottom: one per copper layer, and more where a dielectric is thick. */
export type BoardLayers = {
  /** Node layers in all. */
  count: number;
  /** Node layer of each copper layer. */
  copper: number[];
  /** Sheet conductance of the laminate's share of each node layer, W/K. */
  laminate: number[];
  /** Between node layer l and l + 1: conductance per area, W/(m²·K). */
  through: number[];
  /** Depth of each node layer below the top copper, m; via barrels are as long as the difference. */
  depth: number[];
};

/** Dielectrics thicker than this get node layers of their own, mm. */
const thickestSlabMm = 0.7;

export function boardLayers(board: Board): BoardLayers {
  const { copper, dielectric } = board.stackup;
  const layers: BoardLayers = { count: 1, copper: [0], laminate: [0], through: [], depth: [0] };
  for (const slab of dielectric.slice(0, copper.length - 1)) {
    const parts = Math.max(1, Math.ceil(slab.thicknessMm / thickestSlabMm - 1e-9));
    const thickness = (slab.thicknessMm * 1e-3) / parts;
    for (let part = 0; part < parts; part++) {
      const sheet = slab.inPlaneWPerMK * thickness;
      layers.laminate[layers.count - 1]! += sheet / 2;
      layers.laminate.push(sheet / 2);
      layers.through.push(slab.throughWPerMK / thickness);
      layers.depth.push(layers.depth.at(-1)! + thickness);
      layers.count++;
    }
    layers.copper.push(layers.count - 1);
  }
  return layers;
}

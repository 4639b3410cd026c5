import { heatPathOf, type HeatPath } from '#core/accuracy/heat-path.ts';
import type { Board } from '#core/board/document.ts';
import type { PackageModel } from '#core/board/package.ts';
import type { Regulator } from '#core/board/placement.ts';
import { placedRectangle } from '#core/geometry/placed-rectangle.ts';
import { cellWeights, type CellWeights } from './cell-weights.ts';
import type { CopperMap } from './copper-map.ts';
import type { LandCorrection } from './land-correction.ts';
import { placedLands } from './land-placement.ts';
import { solderWPerM2K } from './materials.ts';

/** Where a regulator sits in the network: its junction node, its lands on the cells, its case top in the air. */
export type PackageNodes = {
  ref: string;
  path: HeatPath;
  junction: number;
  /** `kPerW` from the junction to what the land's cells show; `correctionKPerW` of it lies between the land and its cells. */
  lands: {
    name: string;
    weights: CellWeights;
    slug: number | null;
    layer: number;
    kPerW: number;
    correctionKPerW: number;
  }[];
  side: 'top' | 'bottom';
  caseTopKPerW: number;
  /** Body surface that sees the air, m². */
  caseAreaM2: number;
  /** Side of the square of the body's area, m, and the board under it. */
  bodySideM: number;
  body: CellWeights;
  emissivity: number;
};

type Pair = { a: number; b: number; g: number };

/**
 * Star of a package (JESD15-3's two-resistor model is the case of one land and one top): junction to each land, to the
 * board under the body, and to the case top, whose film is added with the films. A tab is an isothermal slug on solder;
 * leads are spread over their pads.
 * @param corrections of its lands by part and land name
 * @param next number of the next free extra node
 * @param nodeOf node of a cell on an outer face of a side
 */
export function packageStar(
  board: Board,
  map: CopperMap,
  regulator: Regulator,
  model: PackageModel,
  corrections: ReadonlyMap<string, ReadonlyMap<string, LandCorrection>>,
  next: number,
  nodeOf: (cell: number, side: 'top' | 'bottom') => number,
): { nodes: PackageNodes; pairs: Pair[]; used: number } {
  const junction = next;
  let used = 1;
  const pairs: Pair[] = [];
  const lands = placedLands(board, regulator).map(({ land, pads, layer }) => {
    const weights = cellWeights(map, pads);
    const slug = land.kind === 'tab' && weights.cell.length > 0 ? next + used++ : null;
    // A correction below zero may not eat up the package's own resistance.
    const kPerW = Math.max(0.1 * land.kPerW, land.kPerW + (corrections.get(regulator.ref)?.get(land.name)?.kPerW ?? 0));
    if (slug !== null) pairs.push({ a: junction, b: slug, g: 1 / kPerW });
    weights.cell.forEach((cell, k) => {
      const node = nodeOf(cell, regulator.side);
      if (slug === null) pairs.push({ a: junction, b: node, g: weights.weight[k]! / kPerW });
      else pairs.push({ a: slug, b: node, g: solderWPerM2K * weights.areaM2 * weights.weight[k]! });
    });
    return { name: land.name, weights, slug, layer, kPerW, correctionKPerW: kPerW - land.kPerW };
  });
  const [length, width, height] = model.bodyMm;
  if (model.underBodyKPerW !== null) {
    const padCells = new Set(lands.flatMap((land) => [...land.weights.cell]));
    const under = cellWeights(map, [placedRectangle(regulator, [0, 0], [length, width])], (at) => {
      const columns = map.grid.columns * map.grid.split;
      const cell =
        Math.floor(Math.floor(at / columns) / map.grid.split) * map.grid.columns +
        Math.floor((at % columns) / map.grid.split);
      return padCells.has(cell);
    });
    under.cell.forEach((cell, k) => {
      pairs.push({ a: junction, b: nodeOf(cell, regulator.side), g: under.weight[k]! / model.underBodyKPerW! });
    });
  }
  const nodes: PackageNodes = {
    ref: regulator.ref,
    path: heatPathOf(model),
    junction,
    lands,
    side: regulator.side,
    caseTopKPerW: model.caseTopKPerW,
    caseAreaM2: (length * width + 2 * (length + width) * height) * 1e-6,
    bodySideM: Math.sqrt(length * width) * 1e-3,
    body: cellWeights(map, [placedRectangle(regulator, [0, 0], [length, width])]),
    emissivity: model.emissivity,
  };
  return { nodes, pairs, used };
}

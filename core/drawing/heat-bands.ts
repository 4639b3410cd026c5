import { contours } from 'd3-contour';
import type { HeatField } from '#core/thermal/heat-field.ts';
import { type HeatScale, bandColour } from './heat-scale.ts';
import { type PaddedGrid, paddedGrid } from './padded-grid.ts';

export type MmRing = readonly (readonly [number, number])[];
/** Everything at or above `fromC`; drawn in rising order, each band covers the hotter part of the one before. */
export type HeatBand = { fromC: number; colour: string; polygons: readonly (readonly MmRing[])[] };
/** Lines of one temperature, closed rings in mm. */
export type Isotherm = { valueC: number; rings: readonly MmRing[] };

/**
 * Filled bands of one copper layer, in mm. They reach a little beyond the board: clip them to its outline.
 * Empty when the field has no such layer.
 */
export function heatBands(field: HeatField, layerName: string, scale: HeatScale): HeatBand[] {
  const grid = paddedGrid(field, layerName);
  if (!grid) return [];
  return scale.levels.flatMap((level, index) => {
    // The coolest band is the ground: nothing lies below it.
    const polygons = regions(grid, index === 0 ? -1e6 : level);
    return polygons.length > 0 ? [{ fromC: level, colour: bandColour(scale, index), polygons }] : [];
  });
}

/** Isotherms at the given temperatures, in mm; those that the layer does not reach are left out. */
export function isotherms(field: HeatField, layerName: string, valuesC: readonly number[]): Isotherm[] {
  const grid = paddedGrid(field, layerName);
  if (!grid) return [];
  return valuesC.flatMap((valueC) => {
    const rings = regions(grid, valueC).flat();
    return rings.length > 0 ? [{ valueC, rings }] : [];
  });
}

function regions(grid: PaddedGrid, valueC: number): MmRing[][] {
  const contour = contours().size([grid.columns, grid.rows]).contour(grid.valuesC, valueC);
  return contour.coordinates.map((polygon) =>
    polygon.map((ring) => ring.map(([x = 0, y = 0]) => [place(grid.xMm, x), place(grid.yMm, y)] as const)),
  );
}

/** Index space of d3-contour (centre of cell i at i + ½) to mm. */
function place(centresMm: Float64Array, index: number): number {
  const position = index - 0.5;
  const low = Math.min(Math.max(Math.floor(position), 0), centresMm.length - 2);
  const from = centresMm[low] ?? 0;
  const to = centresMm[low + 1] ?? 0;
  return from + (to - from) * (position - low);
}

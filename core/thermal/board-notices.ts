import type { ViaField } from '#core/board/copper.ts';
import { copperSpan } from './copper-span.ts';
import type { BoardModel } from './board-model.ts';
import { mostCorrectedLands } from './land-corrections.ts';
import { laminateRange, leastEmissivity } from './materials.ts';
import type { ThermalNotice } from './solution.ts';
import { viaLengthRange } from './via-conductance.ts';

/** Where a board leaves the range that its conduction, its vias or its radiation were published or checked for; the same in every condition. */
export function boardNotices(model: BoardModel): ThermalNotice[] {
  const { board, layers, packages } = model;
  const notices: ThermalNotice[] = [];
  const note = (code: string, message: string, ref: string | null = null) => notices.push({ code, ref, message });
  if (board.stackup.copper.length === 1) {
    note(
      'no-laminate',
      'A board of one copper layer is solved as foil alone. Add a bare lower layer, so that its laminate is stated.',
    );
  }
  const { inPlane, through } = laminateRange;
  board.stackup.dielectric.slice(0, layers.copper.length - 1).forEach((slab, k) => {
    const isInside =
      slab.inPlaneWPerMK >= inPlane[0] &&
      slab.inPlaneWPerMK <= inPlane[1] &&
      slab.throughWPerMK >= through[0] &&
      slab.throughWPerMK <= through[1];
    if (isInside) return;
    note(
      'laminate-range',
      `Dielectric ${k + 1} conducts ${slab.inPlaneWPerMK} W/(m·K) in plane and ${slab.throughWPerMK} through; the model was checked against boards of epoxy laminate, ${inPlane.join(' to ')} and ${through.join(' to ')}.`,
    );
  });
  for (const via of board.viaFields) viaNotices(model, via, note);
  const emissivities = [
    board.stackup.emissivityTop,
    board.stackup.emissivityBottom,
    ...board.pours.flatMap(({ emissivity }) => emissivity ?? []),
  ];
  const least = Math.min(...emissivities);
  if (least < leastEmissivity) {
    note(
      'emissivity-range',
      `An emissivity of ${least} is below the ${leastEmissivity} of bare polished copper; real faces soil and oxidise.`,
    );
  }
  const lands = packages.reduce((sum, nodes) => sum + nodes.lands.length, 0);
  if (lands > mostCorrectedLands) {
    note(
      'lands-uncorrected',
      `With more than ${mostCorrectedLands} lands none is corrected for the cells around it; trust the grid error, or solve on smaller cells.`,
    );
  }
  return notices;
}

function viaNotices(model: BoardModel, via: ViaField, note: (code: string, message: string, ref: string) => void) {
  const ratio = copperSpan(model, via.from, via.to) / (via.drillMm * 1e-3);
  if (ratio < viaLengthRange[0] || ratio > viaLengthRange[1]) {
    note(
      'via-range',
      `Holes of ${via.id} are ${ratio.toPrecision(2)} times as long as wide; a barrel is taken as a plated rod, from ${viaLengthRange.join(' to ')}.`,
      via.id,
    );
  }
  const [px, py] = typeof via.pitchMm === 'number' ? [via.pitchMm, via.pitchMm] : via.pitchMm;
  const outer = via.drillMm + 2e-3 * via.platingUm;
  if ((via.columns > 1 && px < outer) || (via.rows > 1 && py < outer)) {
    note(
      'via-overlap',
      `Barrels of ${via.id} are ${outer.toFixed(2)} mm wide and overlap at their pitch; each is counted whole.`,
      via.id,
    );
  }
}

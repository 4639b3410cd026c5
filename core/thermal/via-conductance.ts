import type { ViaField } from '#core/board/copper.ts';
import { copperWPerMK, resinWPerMK } from './materials.ts';

/**
 * Length of a hole over its drill within which a barrel is a rod of one-dimensional heat flow and evenly plated: shorter, the copper
 * around its ends resists as much as the barrel; longer than about 12 to 1, plating thins in the middle (common practice).
 */
export const viaLengthRange = [0.6, 12] as const;

/**
 * Conductance times length of one barrel, W·m/K: k·π/4·(d_outer² − d_inner²), d_inner the finished hole and
 * d_outer = d_inner + 2·plating, plus the filling of the hole.
 * Source: Texas Instruments SLVA959, 2.5, with its diameters taken for what they are; range: `viaLengthRange`.
 * Check: 0.3 mm hole, 25 µm plating, 1.6 mm, k 385 W/(m·K) is 163 K/W (arithmetic).
 */
export function barrelConductanceLength(via: Pick<ViaField, 'drillMm' | 'platingUm' | 'filling'>): number {
  const inner = via.drillMm * 1e-3;
  const outer = inner + 2 * via.platingUm * 1e-6;
  const filling = { open: 0, resin: resinWPerMK, copper: copperWPerMK }[via.filling];
  return (Math.PI / 4) * (copperWPerMK * (outer * outer - inner * inner) + filling * inner * inner);
}

/** Centres of the holes of a field, mm. */
export function viaCentres(via: ViaField): [number, number][] {
  const [px, py] = typeof via.pitchMm === 'number' ? [via.pitchMm, via.pitchMm] : via.pitchMm;
  const angle = (via.rotationDeg * Math.PI) / 180;
  const centres: [number, number][] = [];
  for (let row = 0; row < via.rows; row++) {
    for (let column = 0; column < via.columns; column++) {
      const x = (column - (via.columns - 1) / 2) * px;
      const y = (row - (via.rows - 1) / 2) * py;
      centres.push([
        via.at[0] + x * Math.cos(angle) - y * Math.sin(angle),
        via.at[1] + x * Math.sin(angle) + y * Math.cos(angle),
      ]);
    }
  }
  return centres;
}

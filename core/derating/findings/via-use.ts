import { polygonContains } from '#core/geometry/polygon.ts';
import { placedLands } from '#core/thermal/land-placement.ts';
import { viaCentres } from '#core/thermal/via-conductance.ts';
import type { Finding } from '#core/result/result.ts';
import type { FindingRule } from '../finding-context.ts';
import { formatNumber } from '#core/format.ts';

/** Largest open hole that a solder land bears before it drinks the solder, mm (common practice). */
const openHoleMm = 0.3;

/** Via fields that reach copper of their net on one layer only, and open holes in solder lands. */
export const viaUse: FindingRule = ({ board }) => {
  const order = board.stackup.copper.map((copper) => copper.name);
  const lands = board.regulators.flatMap((regulator) =>
    placedLands(board, regulator).map((land) => ({ ...land, ref: regulator.ref })),
  );
  return board.viaFields.flatMap((via): Finding[] => {
    const centres = viaCentres(via);
    const from = order.indexOf(via.from);
    const to = order.indexOf(via.to);
    const reached = order.filter((name, layer) => {
      if (layer < from || layer > to) return false;
      if (board.stackup.copper[layer]!.plane?.net === via.net) return true;
      if (lands.some((land) => land.layer === layer && land.net === via.net && hits(land.pads, centres))) return true;
      return board.pours.some((pour) => pour.layer === name && pour.net === via.net && hits([pour.points], centres));
    });
    const found: Finding[] = [];
    if (reached.length < 2) {
      found.push({
        rule: 'vias-reach-nothing',
        severity: 'warn',
        ref: via.id,
        condition: null,
        message: `Via field ${via.id} joins copper of ${via.net} on ${reached.length === 1 ? `${reached[0]} only` : 'no layer'}, so it carries hardly any heat.`,
        remedy: `Draw copper of ${via.net} on another layer that it crosses.`,
      });
    }
    const open = lands.find((land) => (land.layer === from || land.layer === to) && hits(land.pads, centres));
    if (via.filling === 'open' && via.drillMm > openHoleMm && open) {
      found.push({
        rule: 'open-vias-in-land',
        severity: 'warn',
        ref: via.id,
        condition: null,
        message: `Via field ${via.id} has open holes of ${formatNumber(via.drillMm, 2)} mm in the land “${open.land.name}” of ${open.ref}; they draw solder from it.`,
        remedy: `Drill ${openHoleMm} mm or less, or have the holes filled, and tell the fabricator.`,
      });
    }
    return found;
  });
};

const hits = (rings: readonly (readonly (readonly [number, number])[])[], centres: readonly [number, number][]) =>
  centres.some(([x, y]) => rings.some((ring) => polygonContains(ring, x, y)));

import { polygonContains } from '#core/geometry/polygon.ts';
import { polygonsOverlap } from '#core/geometry/ring-checks.ts';
import { isOwnCopper, placedLands } from '#core/thermal/land-placement.ts';
import { viaCentres } from '#core/thermal/via-conductance.ts';
import type { Finding } from '#core/result/result.ts';
import type { FindingRule } from '../finding-context.ts';

/** Copper of another net on a land: a pour that touches it, or holes in it. The tab's net decides which copper may be used. */
export const tabNetMismatch: FindingRule = ({ board }) => {
  const found: Finding[] = [];
  for (const regulator of board.regulators) {
    for (const { land, net, layer, pads } of placedLands(board, regulator)) {
      // Leads that share a land may lie on several nets; "none" says nothing about them.
      if (land.kind === 'lead' && isOwnCopper(net)) continue;
      const layerName = board.stackup.copper[layer]!.name;
      const shownNet = isOwnCopper(net) ? 'no net' : net;
      const what = land.kind === 'tab' ? 'tab' : 'land';
      const report = (object: string, otherNet: string) =>
        found.push({
          rule: 'tab-net-mismatch',
          severity: 'stop',
          ref: regulator.ref,
          condition: null,
          message: `${object} is on ${otherNet}, but the ${what} “${land.name}” of ${regulator.ref} that it touches is on ${shownNet}.`,
          remedy: `Draw copper of ${shownNet} there, or keep ${object} clear of the ${what}.`,
        });
      for (const pour of board.pours) {
        if (pour.layer !== layerName || pour.net === net) continue;
        const touches = pads.some(
          (pad) =>
            polygonsOverlap(pour.points, pad) &&
            !pour.holes.some((hole) => pad.every(([x, y]) => polygonContains(hole, x, y))),
        );
        if (touches) report(`Pour ${pour.id}`, pour.net);
      }
      for (const via of board.viaFields) {
        if (via.net === net) continue;
        const order = board.stackup.copper.map((copper) => copper.name);
        if (order.indexOf(via.from) > layer || order.indexOf(via.to) < layer) continue;
        if (viaCentres(via).some(([x, y]) => pads.some((pad) => polygonContains(pad, x, y)))) {
          report(`Via field ${via.id}`, via.net);
        }
      }
    }
  }
  return found;
};

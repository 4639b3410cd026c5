import type { Board } from '#core/board/document.ts';
import { boundsOf, polygonArea, polygonContains } from '#core/geometry/polygon.ts';
import { distanceToEdge } from '#core/geometry/ring-checks.ts';
import { placedLands } from '#core/thermal/land-placement.ts';
import type { FindingRule } from '../finding-context.ts';

const reachMm = 5;
const enough = 1.5;
const stepMm = 0.25;

/** A tab whose net has hardly any copper around it: less than 1.5 × its own area within 5 mm, on its layer. */
export const tabCopper: FindingRule = ({ board }) =>
  board.regulators.flatMap((regulator) =>
    placedLands(board, regulator)
      .filter(({ land }) => land.kind === 'tab')
      .filter(({ net, layer, pads }) => {
        const area = pads.reduce((sum, pad) => sum + polygonArea(pad), 0);
        return copperNear(board, net, layer, pads) < enough * area;
      })
      .map(({ land }) => ({
        rule: 'tab-without-copper',
        severity: 'warn' as const,
        ref: regulator.ref,
        condition: null,
        message: `The tab “${land.name}” of ${regulator.ref} has hardly any copper of its net within ${reachMm} mm.`,
        remedy: 'Draw a pour of its net around it, solid, not through relief spokes.',
      })),
  );

/** Copper of a net within reach of the pads, the pads' own area included, mm². */
function copperNear(board: Board, net: string, layer: number, pads: readonly [number, number][][]): number {
  const copper = board.stackup.copper[layer]!;
  if (copper.plane?.net === net) return Infinity;
  const pours = board.pours.filter((pour) => pour.layer === copper.name && pour.net === net);
  const all = boundsOf(pads.flat());
  let count = 0;
  for (let x = all.minX - reachMm; x <= all.maxX + reachMm; x += stepMm) {
    for (let y = all.minY - reachMm; y <= all.maxY + reachMm; y += stepMm) {
      const inPad = pads.some((pad) => polygonContains(pad, x, y));
      if (!inPad && !pads.some((pad) => distanceToEdge(pad, x, y) <= reachMm)) continue;
      const covered = pours.some(
        (pour) => polygonContains(pour.points, x, y) && !pour.holes.some((hole) => polygonContains(hole, x, y)),
      );
      if (inPad || covered) count++;
    }
  }
  return count * stepMm * stepMm;
}

import type { Board } from '#core/board/document.ts';
import { boundsOf, polygonArea, polygonContains, type Ring } from '#core/geometry/polygon.ts';
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
        return !hasCopperNear(board, net, layer, pads, (enough - 1) * area);
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

/** Whether a net has so much copper within reach of the pads, mm², their own area not counted; looks no further than needed. */
function hasCopperNear(board: Board, net: string, layer: number, pads: readonly Ring[], areaMm2: number): boolean {
  const copper = board.stackup.copper[layer]!;
  if (copper.plane?.net === net) return true;
  const pours = board.pours.filter((pour) => pour.layer === copper.name && pour.net === net);
  const all = boundsOf(pads.flat());
  const needed = areaMm2 / (stepMm * stepMm);
  let count = 0;
  for (let x = all.minX - reachMm; x <= all.maxX + reachMm; x += stepMm) {
    for (let y = all.minY - reachMm; y <= all.maxY + reachMm; y += stepMm) {
      const covered = pours.some(
        (pour) => polygonContains(pour.points, x, y) && !pour.holes.some((hole) => polygonContains(hole, x, y)),
      );
      if (!covered || pads.some((pad) => polygonContains(pad, x, y))) continue;
      if (pads.some((pad) => distanceToEdge(pad, x, y) <= reachMm) && ++count >= needed) return true;
    }
  }
  return false;
}

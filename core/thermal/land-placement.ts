import type { Board } from '#core/board/document.ts';
import type { Land } from '#core/board/package.ts';
import type { Regulator } from '#core/board/placement.ts';
import { placedRectangle } from '#core/geometry/placed-rectangle.ts';

/** A land of a placed regulator: its net (a name of its own for copper on no net), its layer and its pads on the board. */
export type PlacedLand = { land: Land; net: string; layer: number; pads: [number, number][][] };

/** Net of a land; copper on net `none` gets a name that no document can use. */
export function netOfLand(board: Board, regulator: Regulator, landName: string): string {
  const role = board.parts[regulator.part]?.landNets[landName] ?? 'none';
  return role === 'none' ? `\u0000${regulator.ref} ${landName}` : regulator.nets[role];
}

/** Whether a net name stands for copper on no net. */
export const isOwnCopper = (net: string) => net.startsWith('\u0000');

export function placedLands(board: Board, regulator: Regulator): PlacedLand[] {
  const part = board.parts[regulator.part];
  const model = part && board.packages[part.package];
  if (!model) return [];
  return model.lands.map((land) => ({
    land,
    net: netOfLand(board, regulator, land.name),
    layer: regulator.side === 'top' ? 0 : board.stackup.copper.length - 1,
    pads: land.pads.map((pad) => placedRectangle(regulator, pad.at, pad.sizeMm)),
  }));
}

import type { ViaField } from '#core/board/copper.ts';
import type { Board } from '#core/board/document.ts';
import type { Ring } from '#core/board/outline.ts';
import type { Regulator } from '#core/board/placement.ts';
import { placedRectangle } from '#core/geometry/placed-rectangle.ts';

type Mm = readonly [number, number];

/** Corners of a rectangle about its centre, mm. */
export function rectangleRing(at: Mm, size: readonly number[], rotationDeg: number): Ring {
  const [width = 0, height = 0] = size;
  return placedRectangle({ at, rotationDeg, side: 'top' }, [0, 0], [width, height]);
}

export function bodyRing(board: Board, regulator: Regulator): Ring | null {
  const model = packageOf(board, regulator);
  return model ? placedRectangle(regulator, [0, 0], [model.bodyMm[0], model.bodyMm[1]]) : null;
}

export type LandRing = { land: string; kind: 'tab' | 'lead'; ring: Ring };

/** Every pad of a regulator's package on the board; empty where part or package is missing. */
export function landRings(board: Board, regulator: Regulator): LandRing[] {
  return (packageOf(board, regulator)?.lands ?? []).flatMap((land) =>
    land.pads.map((pad) => ({
      land: land.name,
      kind: land.kind,
      ring: placedRectangle(regulator, pad.at, pad.sizeMm),
    })),
  );
}

export function packageOf(board: Board, regulator: Regulator) {
  const part = board.parts[regulator.part];
  return part ? board.packages[part.package] : undefined;
}

export function pitchOf(field: ViaField): [number, number] {
  return typeof field.pitchMm === 'number' ? [field.pitchMm, field.pitchMm] : [field.pitchMm[0], field.pitchMm[1]];
}

/** Frame around all barrels of a via field. */
export function viaFieldRing(field: ViaField): Ring {
  const [px, py] = pitchOf(field);
  const outer = field.drillMm + (2 * field.platingUm) / 1000;
  return rectangleRing(field.at, [(field.columns - 1) * px + outer, (field.rows - 1) * py + outer], field.rotationDeg);
}

/** Ring of the rectangle between two opposite corners. */
export function rectangleBetween([x1, y1]: Mm, [x2, y2]: Mm): Ring {
  const [left, right] = [Math.min(x1, x2), Math.max(x1, x2)];
  const [bottom, top] = [Math.min(y1, y2), Math.max(y1, y2)];
  return [
    [left, bottom],
    [right, bottom],
    [right, top],
    [left, top],
  ];
}

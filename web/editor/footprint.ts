import type { ViaField } from '#core/board/copper.ts';
import type { Board } from '#core/board/document.ts';
import type { Point, Ring } from '#core/board/outline.ts';
import type { Regulator } from '#core/board/placement.ts';

type Mm = readonly [number, number];

/** Corners of a rectangle about its centre, counter-clockwise from the lower left one, mm. */
export function rectangleRing(at: Mm, size: readonly number[], rotationDeg: number): Ring {
  const [w = 0, h = 0] = size;
  return (
    [
      [-w / 2, -h / 2],
      [w / 2, -h / 2],
      [w / 2, h / 2],
      [-w / 2, h / 2],
    ] as const
  ).map((corner) => placed(corner, at, rotationDeg, false));
}

/** A point of a part's own drawing on the board; parts below are seen through the board, so x is mirrored first. */
export function placed([x, y]: Mm, at: Mm, rotationDeg: number, mirrored: boolean): Point {
  const angle = (rotationDeg * Math.PI) / 180;
  const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
  const own = mirrored ? -x : x;
  return [at[0] + own * cos - y * sin, at[1] + own * sin + y * cos];
}

export function bodyRing(board: Board, regulator: Regulator): Ring | null {
  const model = packageOf(board, regulator);
  return model ? placedRectangle([0, 0], model.bodyMm, regulator) : null;
}

export type LandRing = { land: string; kind: 'tab' | 'lead'; ring: Ring };

/** Every pad of a regulator's package on the board; empty where part or package is missing. */
export function landRings(board: Board, regulator: Regulator): LandRing[] {
  return (packageOf(board, regulator)?.lands ?? []).flatMap((land) =>
    land.pads.map((pad) => ({
      land: land.name,
      kind: land.kind,
      ring: placedRectangle(pad.at, pad.sizeMm, regulator),
    })),
  );
}

export function packageOf(board: Board, regulator: Regulator) {
  const part = board.parts[regulator.part];
  return part ? board.packages[part.package] : undefined;
}

function placedRectangle(centre: Mm, size: readonly number[], regulator: Regulator): Ring {
  return rectangleRing(centre, size, 0).map((corner) =>
    placed(corner, regulator.at, regulator.rotationDeg, regulator.side === 'bottom'),
  );
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

/** Even-odd rule; points on the edge may fall on either side. */
export function contains(ring: readonly Mm[], [x, y]: Mm): boolean {
  let inside = false;
  for (let index = 0, before = ring.length - 1; index < ring.length; before = index++) {
    const [xi, yi] = ring[index] ?? [0, 0];
    const [xj, yj] = ring[before] ?? [0, 0];
    if (yi > y !== yj > y && x < ((xj - xi) * (y - yi)) / (yj - yi) + xi) inside = !inside;
  }
  return inside;
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

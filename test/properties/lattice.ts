import fc from 'fast-check';
import type { Ring } from '#core/board/outline.ts';

/** Cell that random boards are solved on, mm, and the lattice of its eight sub-cells that their copper is drawn on. */
export const latticeCellMm = 1.2;
export const latticeMm = 0.15;

/** Off every line of the lattice, so that nothing that is turned or mirrored stands on a line between two cells. */
const offMm = 0.0437;

export const onLattice = (steps: number) => Math.round(steps * latticeMm * 1e6) / 1e6;

/** Corners of a rectangle from lattice steps. */
export function latticeRectangle(left: number, low: number, columns: number, rows: number): Ring {
  const [x0, y0, x1, y1] = [left, low, left + columns, low + rows].map(onLattice) as [number, number, number, number];
  return [
    [x0, y0],
    [x1, y0],
    [x1, y1],
    [x0, y1],
  ];
}

/** A point inside or a little outside a board of so many steps. */
export const place = (columns: number, rows: number) =>
  fc
    .tuple(fc.integer({ min: -4, max: columns + 4 }), fc.integer({ min: -4, max: rows + 4 }))
    .map(([x, y]): [number, number] => [onLattice(x) + offMm, onLattice(y) + offMm]);

/** A rectangle that may reach over the edge. */
export const area = (columns: number, rows: number) =>
  fc
    .record({
      left: fc.integer({ min: -6, max: columns - 4 }),
      low: fc.integer({ min: -6, max: rows - 4 }),
      columns: fc.integer({ min: 1, max: columns }),
      rows: fc.integer({ min: 1, max: rows }),
    })
    .map((box) => box);

export type Box = { left: number; low: number; columns: number; rows: number };
export const ringOf = ({ left, low, columns, rows }: Box) => latticeRectangle(left, low, columns, rows);

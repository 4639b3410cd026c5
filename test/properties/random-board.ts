import fc from 'fast-check';
import type { Board, BoardDocument } from '#core/board/document.ts';
import type { Ring } from '#core/board/outline.ts';
import { readBoard } from '#core/board/read-board.ts';
import { typicalPackages } from '#core/catalog/typical-packages.ts';
import { latticeCellMm, latticeMm, latticeRectangle, onLattice, place } from './lattice.ts';
import { net, randomPours, randomStackup, randomViaFields } from './random-copper.ts';
import { catalogParts, randomRegulators, randomSources } from './random-parts.ts';

/** A document and the board that it reads as. */
export type Drawn = { document: BoardDocument; board: Board };

type Condition = BoardDocument['conditions'][number];

const perCell = Math.round(latticeCellMm / latticeMm);

/** A rectangle, one with a corner taken out, or one with a notch in its upper edge; a cut-out in the lower left. */
const outline = (columns: number, rows: number): fc.Arbitrary<BoardDocument['outline']> =>
  fc
    .record({ shape: fc.constantFrom('rectangle', 'corner', 'notch'), cutout: fc.boolean() })
    .map(({ shape, cutout }) => {
      const [w, h] = [columns, rows].map(onLattice) as [number, number];
      const [a, b, c] = [columns >> 1, rows - (rows >> 2), (columns >> 1) + 2].map(onLattice) as [
        number,
        number,
        number,
      ];
      const points: Record<string, Ring> = {
        rectangle: latticeRectangle(0, 0, columns, rows),
        corner: [
          [0, 0],
          [w, 0],
          [w, b],
          [a, b],
          [a, h],
          [0, h],
        ],
        notch: [
          [0, 0],
          [w, 0],
          [w, h],
          [c, h],
          [c, b],
          [a, b],
          [a, h],
          [0, h],
        ],
      };
      const hole = latticeRectangle(columns >> 2, rows >> 2, Math.max(2, columns >> 3), Math.max(2, rows >> 3));
      return { points: points[shape]!, cutouts: cutout ? [hole] : [] };
    });

const surroundings = fc.record({
  orientation: fc.constantFrom('horizontal' as const, 'vertical' as const),
  altitudeM: fc.constantFrom(0, 0, 2500),
  boxRiseK: fc.constantFrom(0, 12),
  around: fc.constantFrom<Pick<Condition, 'air' | 'filmWPerM2K'>>(
    { air: { kind: 'still' } },
    { air: { kind: 'moving', speedMPerS: 1.3, towardDeg: 0 } },
    { air: { kind: 'moving', speedMPerS: 0.4, towardDeg: 205 } },
    { air: { kind: 'still' }, filmWPerM2K: 9 },
    { air: { kind: 'still' }, filmWPerM2K: { top: 40, bottom: 2 } },
  ),
});

/** A small board of every kind of object, on the lattice. It has one condition, "typical". */
export const randomBoard: fc.Arbitrary<Drawn> = fc
  .record({
    cellColumns: fc.integer({ min: 4, max: 14 }),
    cellRows: fc.integer({ min: 4, max: 11 }),
    stackup: randomStackup,
    around: surroundings,
  })
  .chain(({ cellColumns, cellRows, stackup, around }) => {
    const [columns, rows] = [cellColumns * perCell, cellRows * perCell];
    const layers = stackup.copper.length;
    return fc
      .record({
        outline: outline(columns, rows),
        pours: randomPours(layers, columns, rows),
        viaFields: randomViaFields(layers, columns, rows),
        regulators: randomRegulators(columns, rows),
        sources: randomSources(columns, rows),
        sinkAt: fc.option(place(columns, rows)),
        probeAt: place(columns, rows),
        loads: fc.array(fc.constantFrom(0, 0.02, 0.15), { minLength: 4, maxLength: 4 }),
        edge: net,
      })
      .map(({ sinkAt, probeAt, loads, edge, ...drawn }): Drawn => {
        const { air, filmWPerM2K = null } = around.around;
        const document: BoardDocument = {
          format: 'dropwatt-board',
          version: 1,
          title: `Random board, ${edge}`,
          stackup,
          ...drawn,
          packages: { ...typicalPackages },
          parts: catalogParts,
          sinks: sinkAt
            ? [
                {
                  id: 's1',
                  at: sinkAt,
                  sizeMm: [1.5, 1.5],
                  layer: `L${layers}`,
                  conductanceWPerK: 0.02,
                  toC: 'ambient',
                },
              ]
            : [],
          probes: [{ id: 't1', at: probeAt }],
          supplies: [{ name: 'VIN', minV: 4.5, nominalV: 5, maxV: 5.6 }],
          conditions: [
            {
              name: 'typical',
              ambientC: 25,
              boxRiseK: around.boxRiseK,
              altitudeM: around.altitudeM,
              orientation: around.orientation,
              air,
              filmWPerM2K,
              supplies: { VIN: 5 },
              loadsA: Object.fromEntries(drawn.regulators.map(({ ref }, k) => [ref, loads[k]!])),
            },
          ],
          criteria: { name: 'House', rules: [{ quantity: 'junctionC', belowMaxK: 25, source: 'made up for tests' }] },
        };
        return read(document);
      });
  });

/** @throws Error when the generator has drawn what the product does not accept */
export function read(document: BoardDocument): Drawn {
  const reading = readBoard(document);
  if (!reading.ok) throw new Error(reading.faults.map(({ path, message }) => `${path} ${message}`).join('\n'));
  return { document, board: reading.board };
}

/** The same board with a film that does not depend on temperature. */
export const withFixedFilm = (board: Board, filmWPerM2K: number | { top: number; bottom: number } = 8): Board => ({
  ...board,
  conditions: board.conditions.map((condition) => ({ ...condition, filmWPerM2K })),
});

import fc from 'fast-check';
import type { BoardDocument } from '#core/board/document.ts';
import { area, place, ringOf, type Box } from './lattice.ts';

export const nets = ['GND', 'VIN', 'OUT', 'X'] as const;
export const net = fc.constantFrom(...nets);

type Stackup = BoardDocument['stackup'];
type Pour = NonNullable<BoardDocument['pours']>[number];
type ViaField = NonNullable<BoardDocument['viaFields']>[number];

const layerCopper = fc.oneof(
  { weight: 3, arbitrary: fc.constant({}) },
  fc.record({ plane: fc.record({ net, coverage: fc.constantFrom(1, 0.7, 0), insetMm: fc.constantFrom(0, 0.6, 3) }) }),
  fc.record({ traces: fc.record({ coverage: fc.constantFrom(0, 0.2, 1) }) }),
);

/** One to four copper layers, from thin foil to thick copper, usual laminate and a metal core. */
export const randomStackup: fc.Arbitrary<Stackup> = fc
  .array(fc.tuple(fc.constantFrom(1, 18, 35, 70, 400), layerCopper), { minLength: 1, maxLength: 4 })
  .chain((copper) =>
    fc.record({
      copper: fc.constant(copper.map(([thicknessUm, more], k) => ({ name: `L${k + 1}`, thicknessUm, ...more }))),
      dielectric: fc.array(
        fc.record({
          thicknessMm: fc.constantFrom(0.05, 0.2, 0.6, 1.5),
          inPlaneWPerMK: fc.constantFrom(0.05, 0.9, 180),
          throughWPerMK: fc.constantFrom(0.05, 0.3, 2),
        }),
        { minLength: copper.length - 1, maxLength: copper.length - 1 },
      ),
      emissivityTop: fc.constantFrom(0.9, 0.05),
      maxOperatingC: fc.constant(130),
    }),
  );

/** A hole or a slot one step wide, inside its pour. */
function holeIn({ left, low, columns, rows }: Box, slot: boolean) {
  if (columns < 5 || rows < 5) return [];
  const inner = { left: left + 2, low: low + 2, columns: slot ? 1 : columns - 4, rows: rows - 4 };
  return [ringOf(inner)];
}

export const randomPours = (layers: number, columns: number, rows: number): fc.Arbitrary<Pour[]> =>
  fc
    .array(
      fc.record({
        layer: fc.integer({ min: 1, max: layers }),
        net,
        box: area(columns, rows),
        hole: fc.constantFrom('none', 'hole', 'slot'),
        coverage: fc.constantFrom(1, 1, 0.5, 0),
        emissivity: fc.constantFrom(null, 0.05),
      }),
      { maxLength: 5 },
    )
    .map((list) =>
      list.map(({ layer, net: on, box, hole, coverage, emissivity }, k) => ({
        id: `p${k}`,
        layer: `L${layer}`,
        net: on,
        points: ringOf(box),
        holes: hole === 'none' ? [] : holeIn(box, hole === 'slot'),
        coverage,
        emissivity,
      })),
    );

export const randomViaFields = (layers: number, columns: number, rows: number): fc.Arbitrary<ViaField[]> =>
  layers === 1
    ? fc.constant([])
    : fc
        .array(
          fc.record({
            net,
            at: place(columns, rows),
            columns: fc.integer({ min: 1, max: 4 }),
            rows: fc.integer({ min: 1, max: 4 }),
            pitchMm: fc.constantFrom(0.6, 1.2),
            drillMm: fc.constantFrom(0.2, 0.4),
            platingUm: fc.constantFrom(20, 30),
            filling: fc.constantFrom('open' as const, 'resin' as const, 'copper' as const),
            from: fc.integer({ min: 1, max: layers - 1 }),
            deep: fc.integer({ min: 1, max: 3 }),
          }),
          { maxLength: 3 },
        )
        .map((list) =>
          list.map(({ from, deep, ...via }, k) => ({
            id: `v${k}`,
            ...via,
            from: `L${from}`,
            to: `L${Math.min(layers, from + deep)}`,
          })),
        );

import fc from 'fast-check';
import type { BoardDocument } from '#core/board/document.ts';
import { typicalPackages } from '#core/catalog/typical-packages.ts';
import { place } from './lattice.ts';

type Part = BoardDocument['parts'][string];
type Regulator = BoardDocument['regulators'][number];
type Source = NonNullable<BoardDocument['sources']>[number];

/** One part in each package of the catalogue, each with another pass element and other nets under its lands. */
export const catalogParts: Record<string, Part> = Object.fromEntries(
  Object.entries(typicalPackages).map(([key, model], k): [string, Part] => [
    key,
    {
      name: `PART ${key}`,
      package: key,
      passElement: (['npn-darlington', 'npn-pnp', 'pnp', 'pmos', 'nmos'] as const)[k % 5]!,
      outputV: 3.3,
      outputTolerancePct: 2,
      inputMaxV: 24,
      outputMaxA: 1,
      dropoutV: [
        [0.05, 0.2],
        [0.8, 0.6],
      ],
      groundA: [
        [0, 0.0005],
        [0.8, 0.004 + 0.004 * (k % 3)],
      ],
      currentLimit: k % 2 ? { kind: 'constant', limitA: 1.2 } : { kind: 'foldback', kneeA: 1.2, shortA: 0.2 },
      landNets: Object.fromEntries(
        model.lands.map(({ name }, land) => [name, (['ground', 'output', 'none'] as const)[(k + land) % 3]!]),
      ),
      junctionMaxC: 125,
      shutdownC: k % 3 ? null : 150,
      source: 'made up for tests',
    },
  ]),
);

const turn = fc.constantFrom(0, 90, 180, 270, -90);
const side = fc.constantFrom('top' as const, 'bottom' as const);

/** Up to four regulators, on and over each other too; the first is fed from the supply, a later one may be fed from it. */
export const randomRegulators = (columns: number, rows: number): fc.Arbitrary<Regulator[]> =>
  fc
    .array(
      fc.record({
        part: fc.constantFrom(...Object.keys(typicalPackages)),
        at: place(columns, rows),
        rotationDeg: turn,
        side,
        known: fc.constantFrom(null, null, 0, 0.3, 2),
        chained: fc.boolean(),
      }),
      { minLength: 1, maxLength: 4 },
    )
    .map((list) =>
      list.map(({ known, chained, ...placed }, k) => ({
        ref: `U${k + 1}`,
        ...placed,
        nets: { ground: 'GND', input: 'VIN', output: 'OUT' },
        feed: chained && k > 0 ? { regulator: 'U1' } : { supply: 'VIN' },
        powerW: known,
      })),
    );

export const randomSources = (columns: number, rows: number): fc.Arbitrary<Source[]> =>
  fc
    .array(
      fc.record({
        at: place(columns, rows),
        sizeMm: fc.constantFrom<[number, number]>([0.05, 0.05], [2.1, 1.2], [6, 6]),
        bodyMm: fc.constantFrom<[number, number, number] | null>(null, [2.4, 1.5, 1]),
        rotationDeg: turn,
        side,
        powerW: fc.constantFrom(0, 0.05, 0.6),
        limitC: fc.constantFrom(null, 105),
      }),
      { maxLength: 2 },
    )
    .map((list) => list.map((source, k) => ({ ref: `Q${k + 1}`, ...source })));

import { expect, test } from 'vitest';
import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { hardBoard } from './hard-board.ts';
import { solved, tightJunctions, tightRises } from './solved-board.ts';

// Consequences of the M-matrix (its inverse has no negative entry) and of Rayleigh's law for resistor networks.
const board = hardBoard({ sinks: [] });
const model = buildBoardModel(board, { cellMm: 1 });
const junctions = (change: Partial<Condition>, powers = { U1: 0.9, U2: 0.3, Q1: 0.2 }) =>
  [...solved(model, powers, change).regulators.values()].map(({ junctionC }) => junctionC);
/** Films settle to 0.003 K. */
const settled = 0.01;

test('fixed film – more power in one part – no node falls', () => {
  const fixed = { filmWPerM2K: 8 };
  const [less, more] = [
    tightRises(model, { U1: 0.9, U2: 0.3 }, fixed),
    tightRises(model, { U1: 0.9, U2: 0.31 }, fixed),
  ];
  less.forEach((rise, node) => expect(more[node]! - rise).toBeGreaterThan(-1e-6));
  for (const { junction } of model.packages) expect(more[junction]! - less[junction]!).toBeGreaterThan(1e-3);
});

test('fixed film – a better one – no node rises', () => {
  const films = [3, 8, 20, 200, 5000];
  const fields = films.map((film) => tightRises(model, { U1: 0.9, U2: 0.3 }, { filmWPerM2K: film }));
  fields.slice(1).forEach((field, k) => {
    field.forEach((rise, node) => expect(rise - fields[k]![node]!).toBeLessThan(1e-6));
  });
});

test('still air – power doubled again and again – junctions rise, by less than in proportion', () => {
  // Warmer surfaces shed more per kelvin.
  const [a, b, c] = [0.2, 0.4, 0.8].map((power) => junctions({}, { U1: power, U2: power, Q1: 0 }).map((t) => t - 25));
  a!.forEach((first, k) => {
    expect(b![k]).toBeGreaterThan(first);
    expect(b![k]).toBeLessThan(2 * first);
    expect(c![k]).toBeGreaterThan(b![k]!);
    expect(c![k]).toBeLessThan(2 * b![k]!);
  });
});

test('moving air – ever faster – no junction rises', () => {
  const speeds = [0.3, 0.6, 1.2, 2.4, 5];
  const found = speeds.map((speedMPerS) => junctions({ air: { kind: 'moving', speedMPerS, towardDeg: 0 } }));
  found.slice(1).forEach((temperatures, k) => {
    temperatures.forEach((t, part) => expect(t).toBeLessThan(found[k]![part]! + settled));
  });
});

test('ambient – ever warmer, by 20 K – every junction rises, by less than 20 K with radiation', () => {
  const found = [-20, 0, 20, 40, 60].map((ambientC) => junctions({ ambientC }));
  found.slice(1).forEach((temperatures, k) => {
    temperatures.forEach((t, part) => {
      expect(t).toBeGreaterThan(found[k]![part]! + 10);
      expect(t).toBeLessThan(found[k]![part]! + 20 + settled);
    });
  });
});

test('altitude and emissivity – thinner air, barer faces – no junction falls', () => {
  const high = [0, 1500, 3000, 6000].map((altitudeM) => junctions({ altitudeM }));
  high
    .slice(1)
    .forEach((temperatures, k) =>
      temperatures.forEach((t, part) => expect(t).toBeGreaterThan(high[k]![part]! - settled)),
    );
  const bare = [0.9, 0.5, 0.1].map((emissivity) => {
    const faces = { ...board.stackup, emissivityTop: emissivity, emissivityBottom: emissivity };
    return [...solved({ ...board, stackup: faces }, { U1: 0.9, U2: 0.3 }).regulators.values()];
  });
  bare
    .slice(1)
    .forEach((heat, k) =>
      heat.forEach(({ junctionC }, part) => expect(junctionC).toBeGreaterThan(bare[k]![part]!.junctionC + 1)),
    );
});

/** Own rise of each part per watt, fixed film. */
function own(given: Board): number[] {
  const built = buildBoardModel(given, { cellMm: 0.5, correctLands: false });
  return ['U1', 'U2'].map((ref) => tightJunctions(built, { [ref]: 1 }, { filmWPerM2K: 10 }).get(ref)!);
}

test.each<[string, (given: Board) => Board]>([
  ['thicker copper', (given) => withCopper(given, 2)],
  ['laminate that conducts better', (given) => withLaminate(given, 2)],
  [
    'vias filled with copper',
    (given) => ({ ...given, viaFields: given.viaFields.map((via) => ({ ...via, filling: 'copper' as const })) }),
  ],
  ['a larger pour of its net', (given) => larger(given)],
  [
    'a sink to ambient',
    (given) => ({
      ...given,
      sinks: [{ id: 's', at: [16, 10], sizeMm: [3, 3], layer: 'L3', conductanceWPerK: 0.01, toC: 'ambient' as const }],
    }),
  ],
])('fixed film – %s – lowers no part’s own rise per watt the wrong way', (_, change) => {
  // Said of each part's own rise only: copper between a hot and a cool part may warm the cool one.
  const [before, after] = [own(board), own(change(board))];
  after.forEach((rise, part) => expect(rise).toBeLessThan(before[part]! + 1e-6));
  expect(Math.min(...after.map((rise, part) => rise - before[part]!))).toBeLessThan(-1e-3);
});

const withCopper = (given: Board, factor: number): Board => ({
  ...given,
  stackup: {
    ...given.stackup,
    copper: given.stackup.copper.map((layer) => ({ ...layer, thicknessUm: factor * layer.thicknessUm })),
  },
});
const withLaminate = (given: Board, factor: number): Board => ({
  ...given,
  stackup: {
    ...given.stackup,
    dielectric: given.stackup.dielectric.map((slab) => ({
      ...slab,
      inPlaneWPerMK: factor * slab.inPlaneWPerMK,
      throughWPerMK: factor * slab.throughWPerMK,
    })),
  },
});
const larger = (given: Board): Board => ({
  ...given,
  pours: given.pours.map((pour) =>
    pour.id === 'p2'
      ? {
          ...pour,
          points: [
            [1, 1],
            [22, 1],
            [22, 19],
            [1, 19],
          ],
        }
      : pour,
  ),
});

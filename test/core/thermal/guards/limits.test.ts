import { expect, test } from 'vitest';
import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import { publishedBoard, rectangle } from '#test/cases/board-of.ts';
import { hardBoard } from './hard-board.ts';
import { solved } from './solved-board.ts';

const powers = { U1: 0.6, U2: 0.3, Q1: 0.2 };
const board = hardBoard({ sinks: [] });

test('no power at all – every temperature – is the air’s', () => {
  const solution = solved(board, { U1: 0, U2: 0, Q1: 0 }, { ambientC: 61, boxRiseK: 9 });
  expect(solution.status).toBe('converged');
  for (const { junctionC, caseTopC, landC } of solution.regulators.values()) {
    for (const t of [junctionC, caseTopC, landC]) expect(t).toBeCloseTo(70, 9);
  }
});

test('a film without bound – the junction – keeps the package alone: lands and case top side by side', () => {
  const solution = solved(board, { U1: 1, U2: 0, Q1: 0 }, { filmWPerM2K: 1e5 }, 0.25);
  const rise = solution.regulators.get('U1')!.junctionC - 25;
  // Tab 5, lead 60, case 40, gap 200 K/W at once to air: 4.05 K/W. The tab lies under the body, where no
  // air comes, so that its heat spreads sideways first: a few kelvins more, a sixth of what the board has in a usual film.
  const alone = 1 / (1 / 5 + 1 / 60 + 1 / 40 + 1 / 200);
  expect(rise).toBeGreaterThan(alone);
  expect(rise).toBeLessThan(alone + 4);
});

test('copper and laminate without bound – the board – has one temperature, that of all its area and bodies', () => {
  const lumped: Board = {
    ...board,
    regulators: [],
    pours: [],
    viaFields: [],
    stackup: {
      ...board.stackup,
      copper: [
        { name: 'L1', thicknessUm: 500, plane: { net: 'A', coverage: 1, insetMm: 0 }, traces: null },
        { name: 'L3', thicknessUm: 500, plane: { net: 'A', coverage: 1, insetMm: 0 }, traces: null },
      ],
      dielectric: [{ thicknessMm: 0.5, inPlaneWPerMK: 500, throughWPerMK: 500 }],
    },
  };
  const solution = solved(lumped, { Q1: 2 }, { filmWPerM2K: 10 });
  // Both faces of 32 × 20 mm and the four sides of the source's body of 2 × 3 × 1 mm.
  expect((solution.board.meanC - 25) / (2 / (10 * (2 * 640 + 10) * 1e-6))).toBeCloseTo(1, 3);
  expect(solution.board.maxC - solution.board.meanC).toBeLessThan(2);
});

const only = (given: Board, changed: Partial<Board>): Board => ({ ...given, ...changed });
const onePart = hardBoard({ second: false, sinks: [], viaFields: [] });

test.each<[string, Board, Partial<Condition>, number]>([
  ['one cell for the whole board', board, {}, 50],
  ['one row of cells', only(onePart, { outline: { points: rectangle(32, 0.6, [16, 10]), cutouts: [] } }), {}, 0.6],
  [
    'a part that covers the board and more',
    only(onePart, { outline: { points: rectangle(3, 3, [8, 10]), cutouts: [] } }),
    {},
    0.25,
  ],
  [
    'a part at the corner, half of it outside',
    only(onePart, { regulators: [{ ...onePart.regulators[0]!, at: [0, 0] }] }),
    {},
    0.5,
  ],
  ['copper of 1 µm, laminate of 10 µm', only(onePart, { stackup: thinStackup(onePart) }), {}, 0.5],
  ['a single copper layer', only(onePart, singleLayer(onePart)), {}, 0.5],
  ['air as cold as -100 °C at 20 km', board, { ambientC: -100, altitudeM: 20000 }, 1],
  ['air of 250 °C and a box of 200 K', board, { ambientC: 250, boxRiseK: 200 }, 1],
  ['hardly moving air', board, { air: { kind: 'moving', speedMPerS: 0.05, towardDeg: 0 } }, 1],
  ['a storm', board, { air: { kind: 'moving', speedMPerS: 30, towardDeg: 359 } }, 1],
])('%s – the solution – is finite, balanced and not below the air', (_, given, change, cellMm) => {
  const solution = solved(given, powers, change, cellMm);
  expect(solution.status).toBe('converged');
  expect(solution.energy.imbalance).toBeLessThan(1e-6);
  const airC = (change.ambientC ?? 25) + (change.boxRiseK ?? 0);
  for (const { junctionC, caseTopC, landC } of solution.regulators.values()) {
    for (const t of [junctionC, caseTopC, landC]) expect(Number.isFinite(t)).toBe(true);
    expect(junctionC).toBeGreaterThan(airC);
  }
  for (const { temperatureC } of solution.field.layers) {
    for (const t of temperatureC) if (!Number.isNaN(t)) expect(t).toBeGreaterThanOrEqual(airC - 1e-4);
  }
});

function thinStackup({ stackup }: Board): Board['stackup'] {
  return {
    ...stackup,
    copper: stackup.copper.map((layer) => ({ ...layer, thicknessUm: 1 })),
    dielectric: stackup.dielectric.map((slab) => ({ ...slab, thicknessMm: 0.01 })),
  };
}

function singleLayer({ stackup, pours }: Board): Partial<Board> {
  return {
    stackup: { ...stackup, copper: stackup.copper.slice(0, 1), dielectric: [] },
    pours: pours.filter(({ layer }) => layer === 'L1'),
  };
}

test('a part off the board – the solution – names it and still holds the heat that its case sheds', () => {
  const off = only(onePart, { regulators: [{ ...onePart.regulators[0]!, at: [200, 200] }] });
  const solution = solved(off, { U1: 0.1 });
  expect(solution.notices.map(({ code, ref }) => [code, ref])).toContainEqual(['lands-off-board', 'U1']);
  expect(solution.status).toBe('converged');
  expect(Number.isFinite(solution.regulators.get('U1')!.junctionC)).toBe(true);
});

test('a case top of no resistance and one of a million – the junction – lies between the two films', () => {
  const sealed = publishedBoard({
    bodyMm: [10, 10, 1],
    caseTopKPerW: 0.01,
    lands: [{ name: 'x', kind: 'lead', kPerW: 1e6, pads: [{ at: [0, 0], sizeMm: [1, 1] }] }],
    outline: { points: rectangle(12, 12) },
    stackup: onePart.stackup,
    filmWPerM2K: 20,
  });
  // 140 mm² of case at 20 W/(m²·K): 357 K/W; the lands take 0.1 %.
  expect((solved(sealed, { U1: 0.1 }).regulators.get('U1')!.junctionC - 25) / (0.1 / (20 * 140e-6))).toBeCloseTo(1, 2);
});

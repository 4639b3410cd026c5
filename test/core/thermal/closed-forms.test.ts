import { expect, test } from 'vitest';
import { boardDocument, type Board, type BoardDocument } from '#core/board/document.ts';
import { airProperties } from '#core/thermal/air-properties.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { naturalFilm } from '#core/thermal/natural-convection.ts';
import { radiationFilm } from '#core/thermal/radiation.ts';
import { solveCondition } from '#core/thermal/solve-condition.ts';
import { publishedBoard, rectangle } from '../../cases/board-of.ts';

type Sources = NonNullable<BoardDocument['sources']>;

/** A board of heat sources alone, 25 °C, fixed films. */
function heated(
  size: [number, number],
  sources: Sources,
  throughWPerMK: number,
  film: Board['conditions'][number]['filmWPerM2K'],
): Board {
  const base = publishedBoard({
    bodyMm: [1, 1, 1],
    caseTopKPerW: 1,
    lands: [{ name: 'x', kind: 'lead', kPerW: 1, pads: [{ at: [0, 0], sizeMm: [1, 1] }] }],
    outline: { points: rectangle(size[0], size[1], [size[0] / 2, size[1] / 2]) },
    stackup: {
      copper: [
        { name: 'L1', thicknessUm: 35 },
        { name: 'L2', thicknessUm: 35 },
      ],
      dielectric: [{ thicknessMm: 1.6, inPlaneWPerMK: 0.8, throughWPerMK }],
      maxOperatingC: 130,
    },
    pours: [{ id: 'p1', layer: 'L1', net: 'T', points: rectangle(size[0], size[1], [size[0] / 2, size[1] / 2]) }],
    filmWPerM2K: 10,
  });
  const [condition] = base.conditions;
  return boardDocument.parse({
    ...base,
    regulators: [],
    sources,
    conditions: [{ ...condition, filmWPerM2K: film }],
    probes: sources.map(({ ref, at }) => ({ id: ref, at, side: 'top' })),
  });
}

function solve(board: Board, powers: Record<string, number>, cellMm: number) {
  const solution = solveCondition(buildBoardModel(board, { cellMm }), board.conditions[0]!, {
    regulatorsW: new Map(),
    sourcesW: new Map(Object.entries(powers)),
  });
  expect(solution.status).toBe('converged');
  return solution;
}

test('uniform heat on one face – films of 14 and 6 W/(m²·K) – the two-film slab in closed form', () => {
  const board = heated([30, 20], [{ ref: 'Q', at: [15, 10], sizeMm: [30, 20], powerW: 1 }], 0.3, {
    top: 14,
    bottom: 6,
  });
  const solution = solve(board, { Q: 1 }, 0.5);
  // q = h1·T1 + U·T1 with U = 1/(1/h2 + t/k); q = 1 W over 600 mm².
  const topK = 1 / 600e-6 / (14 + 1 / (1 / 6 + 1.6e-3 / 0.3));
  const bottomK = topK / (1 + (6 * 1.6e-3) / 0.3);
  const meanOf = (layer: number) => {
    const { temperatureC } = solution.field.layers[layer]!;
    return temperatureC.reduce((sum, value) => sum + value, 0) / temperatureC.length - 25;
  };
  // The field is kept in single precision.
  expect(meanOf(0) / topK).toBeCloseTo(1, 6);
  expect(meanOf(1) / bottomK).toBeCloseTo(1, 6);
  expect((solution.sources.get('Q')!.meanC - 25) / topK).toBeCloseTo(1, 9);
});

/*
 * Sheet of 80 × 50 mm, G = 390·35e-6 + 0.8·1.6e-3 W/K, both films 10 W/(m²·K), 1 W on 10 × 10 mm at (20, 25) and (60, 25).
 * Double cosine series of 600 × 600 terms, computed for this test: centre 31.51, mean 28.95, centre of the other 6.53 K.
 */
const pair: Sources = [
  { ref: 'A', at: [20, 25], sizeMm: [10, 10], powerW: 1 },
  { ref: 'B', at: [60, 25], sizeMm: [10, 10], powerW: 1 },
];

test('two sources on a sheet – cells of 0.5 mm – the exact series within 1 %, reciprocal and additive', () => {
  const board = heated([80, 50], pair, 100, 10);
  const [a, b, both] = [
    { A: 1, B: 0 },
    { A: 0, B: 1 },
    { A: 2, B: 3 },
  ].map((powers) => solve(board, powers, 0.5));
  expect(Math.abs((a!.probes.get('A')! - 25) / 31.51 - 1)).toBeLessThan(0.01);
  expect(Math.abs((a!.sources.get('A')!.meanC - 25) / 28.95 - 1)).toBeLessThan(0.01);
  expect(Math.abs((a!.probes.get('B')! - 25) / 6.53 - 1)).toBeLessThan(0.01);
  const mean = (solution: typeof a, ref: string) => solution!.sources.get(ref)!.meanC - 25;
  expect(mean(a, 'B') / mean(b, 'A')).toBeCloseTo(1, 6);
  expect(mean(both, 'A') / (2 * mean(a, 'A') + 3 * mean(b, 'A'))).toBeCloseTo(1, 7);
});

test('a board – turned by 90° – keeps its temperatures', () => {
  const upright = heated(
    [50, 80],
    pair.map((source) => ({ ...source, at: [25, source.at[0]] as [number, number] })),
    100,
    10,
  );
  const [one, other] = [heated([80, 50], pair, 100, 10), upright].map((board) => solve(board, { A: 1, B: 0.3 }, 1));
  expect((one!.sources.get('B')!.meanC - 25) / (other!.sources.get('B')!.meanC - 25)).toBeCloseTo(1, 7);
});

test('a part whose lands hardly conduct – its heat – leaves through case top and film in series', () => {
  const board = publishedBoard({
    bodyMm: [6, 5, 2],
    caseTopKPerW: 35,
    lands: [{ name: 'lead', kind: 'lead', kPerW: 1e6, pads: [{ at: [0, 0], sizeMm: [1, 1] }] }],
    outline: { points: rectangle(20, 20) },
    stackup: {
      copper: [
        { name: 'L1', thicknessUm: 35 },
        { name: 'L2', thicknessUm: 35 },
      ],
      dielectric: [{ thicknessMm: 1.6, inPlaneWPerMK: 0.8, throughWPerMK: 0.3 }],
      maxOperatingC: 130,
    },
    filmWPerM2K: 12,
  });
  const solution = solveCondition(buildBoardModel(board, { cellMm: 1 }), board.conditions[0]!, {
    regulatorsW: new Map([['U1', 0.2]]),
    sourcesW: new Map(),
  });
  const heat = solution.regulators.get('U1')!;
  // Top and four sides: 6·5 + 2·(6 + 5)·2 = 74 mm². Lands and board, 1e6 K/W beside it, take about 0.1 % of the heat.
  const film = 1 / (12 * 74e-6);
  expect((heat.junctionC - 25) / (0.2 * (35 + film))).toBeCloseTo(1, 2);
  expect((heat.caseTopC - 25) / (0.2 * film)).toBeCloseTo(1, 2);
});

test('uniform heat on one face of a thick poor board in still air – both faces – each have the film of their own temperature', () => {
  const sources: Sources = [{ ref: 'Q', at: [30, 20], sizeMm: [60, 40], powerW: 1 }];
  const fixed = heated([60, 40], sources, 0.05, 10);
  const board = { ...fixed, conditions: fixed.conditions.map((condition) => ({ ...condition, filmWPerM2K: null })) };
  const solution = solve(board, { Q: 2 }, 2);
  // The same two films and one slab, by plain repetition: length = area ÷ perimeter = 2400 / 200 mm.
  const [areaM2, lengthM, slab, ambientK] = [2400e-6, 0.012, 0.05 / 1.6e-3, 298.15];
  const film = (attitude: 'face-up' | 'face-down', riseK: number) =>
    naturalFilm(attitude, airProperties(ambientK + riseK / 2, 1), riseK, lengthM) +
    radiationFilm(0.9, ambientK + riseK, ambientK);
  let [top, bottom] = [30, 20];
  for (let round = 0; round < 200; round++) {
    const below = film('face-down', bottom);
    top = 2 / areaM2 / (film('face-up', top) + 1 / (1 / below + 1 / slab));
    bottom = top / (1 + below / slab);
  }
  expect(top - bottom).toBeGreaterThan(5);
  expect(solution.sources.get('Q')!.meanC - 25).toBeCloseTo(top, 1);
  expect(solution.field.layers[1]!.temperatureC[100]! - 25).toBeCloseTo(bottom, 1);
});

import { expect, test } from 'vitest';
import type { Board } from '#core/board/document.ts';
import { AirStreaks, type StreakFace } from '#core/thermal/air-streaks.ts';
import { airProperties } from '#core/thermal/air-properties.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { plateFilm } from '#core/thermal/forced-convection.ts';
import { solveCondition } from '#core/thermal/solve-condition.ts';
import { wakeShares, wakeShareUpTo } from '#core/thermal/wake-shares.ts';
import { fr4, publishedBoard, rectangle } from '../../cases/board-of.ts';

test('plate film – from 0 to 0.4 m – is the mean of its two halves', () => {
  const film = plateFilm(20, airProperties(330, 0.9));
  expect((film(0, 0.2) + film(0.2, 0.4)) / 2).toBeCloseTo(film(0, 0.4), 9);
});

test('wake – of one flux along the whole plate – sums to its rise', () => {
  const shares = wakeShares(40);
  for (let n = 0; n <= 40; n++) {
    const row = shares.subarray((n * (n + 1)) / 2, ((n + 1) * (n + 2)) / 2);
    expect(row.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 12);
  }
});

test('wake – of the last thousandth of the plate – is that of the kernel near its singular point', () => {
  // ∫ (0.75·ε)^−⅔ dε = 3·0.75^−⅔·ε^⅓ = 0.3634 at ε 0.001, of 3.533 for the whole plate.
  expect((1 - wakeShareUpTo(0.999)) / (0.3634 / 3.533)).toBeCloseTo(1, 2);
});

const grid = { x0Mm: 0, y0Mm: 0, dxMm: 1.5, dyMm: 1.25, columns: 13, rows: 9, split: 2 };
const cells = grid.columns * grid.rows;

/** Park and Miller's generator. */
function random(seed: number): () => number {
  let state = seed;
  return () => (state = (state * 48271) % 2147483647) / 2147483647;
}

function face(streaks: AirStreaks, next: () => number): StreakFace {
  const footprint = Int32Array.from([45, 46, 58, 59]);
  return {
    film: new Float64Array(cells).map(() => 5 + 20 * next()),
    forced: new Float64Array(cells).map(() => next()),
    exposed: new Float64Array(cells).map((_, cell) => (footprint.includes(cell) ? 0 : 0.5 + next())),
    bodies: [
      {
        junction: 0,
        lead: streaks.leadOf(footprint),
        cell: footprint,
        shed: new Float64Array(4).fill(0.25 / (1.5 * 1.25e-6)),
        own: 2e-3,
        air: -1.7e-3,
        back: 0.9e-3,
      },
    ],
  };
}

test.each([0, 90, 180, 270, 31, 200])(
  'streaks toward %d° – map and transpose – give the same sum of products',
  (towardDeg) => {
    const next = random(60913 + towardDeg);
    const streaks = new AirStreaks(grid, towardDeg);
    const one = face(streaks, next);
    const field = () => new Float64Array(cells).map(() => next() - 0.3);
    const [rise, weight] = [field(), field()];
    const [back, into] = [new Float64Array(cells), new Float64Array(cells)];
    const [junction, junctionWeight] = [Float64Array.of(1.3), Float64Array.of(0.7)];
    const [air, intoJunction] = [Float64Array.of(0), Float64Array.of(0)];
    streaks.forward(one, rise, junction, back, air);
    streaks.backward(one, weight, junctionWeight, into, intoJunction);
    const dot = (a: Float64Array, b: Float64Array) => a.reduce((sum, value, k) => sum + value * b[k]!, 0);
    const left = dot(back, weight) + one.bodies[0]!.back * air[0]! * junctionWeight[0]!;
    const right = dot(into, rise) + intoJunction[0]! * junction[0]!;
    expect(left / right).toBeCloseTo(1, 10);
  },
);

test('a face that sheds the same heat everywhere – air – brings nothing back', () => {
  const streaks = new AirStreaks(grid, 0);
  const one = { ...face(streaks, random(77)), bodies: [], exposed: new Float64Array(cells).fill(1) };
  one.forced.fill(1);
  const back = new Float64Array(cells);
  streaks.forward(
    one,
    one.film.map((film) => 300 / film),
    new Float64Array(0),
    back,
    new Float64Array(0),
  );
  for (const heat of back) expect(Math.abs(heat)).toBeLessThan(1e-15);
});

/** Two like parts in a row along x, on laminate that keeps their heat apart. */
function row(towardDeg: number): Board {
  const board = publishedBoard({
    bodyMm: [5, 5, 1.2],
    caseTopKPerW: 30,
    lands: [{ name: 'tab', kind: 'tab', kPerW: 5, pads: [{ at: [0, 0], sizeMm: [4, 4] }] }],
    outline: { points: rectangle(80, 24, [40, 12]) },
    stackup: {
      copper: [
        { name: 'L1', thicknessUm: 35 },
        { name: 'L2', thicknessUm: 35 },
      ],
      dielectric: [fr4(1.53)],
      maxOperatingC: 130,
    },
    pours: [20, 60].map((x) => ({ id: `p${x}`, layer: 'L1', net: `N${x}`, points: rectangle(14, 14, [x, 12]) })),
  });
  const [condition] = board.conditions;
  return {
    ...board,
    regulators: [20, 60].map((x) => ({
      ...board.regulators[0]!,
      ref: `U${x}`,
      at: [x, 12],
      nets: { ground: `N${x}`, input: 'IN', output: 'OUT' },
    })),
    conditions: [{ ...condition!, air: { kind: 'moving', speedMPerS: 1.2, towardDeg } }],
  };
}

const solved = (towardDeg: number) => {
  const model = buildBoardModel(row(towardDeg), { cellMm: 0.8 });
  return solveCondition(model, model.board.conditions[0]!, {
    regulatorsW: new Map([
      ['U20', 1],
      ['U60', 1],
    ]),
    sourcesW: new Map(),
  });
};

test('two parts in a stream – the one behind – is warmed by the air, the one before it is not', () => {
  const solution = solved(0);
  expect(solution.status).toBe('converged');
  expect(solution.energy.imbalance).toBeLessThan(1e-6);
  const [first, second] = [solution.regulators.get('U20')!, solution.regulators.get('U60')!];
  expect(second.preheatedAirK).toBeGreaterThan(1);
  expect(Math.abs(first.preheatedAirK)).toBeLessThan(0.1);
  expect(second.junctionC).toBeGreaterThan(first.junctionC + 1);
  for (const [ref, heat] of solution.regulators) {
    const sum = solution.ledger.filter(({ victim }) => victim === ref).reduce((total, { riseK }) => total + riseK, 0);
    expect(sum).toBeCloseTo(heat.junctionC - 25, 3);
  }
});

test('a stream turned round – two like parts – change places', () => {
  const [there, back] = [solved(0), solved(180)];
  expect(there.regulators.get('U20')!.junctionC).toBeCloseTo(back.regulators.get('U60')!.junctionC, 1);
  expect(there.regulators.get('U60')!.junctionC).toBeCloseTo(back.regulators.get('U20')!.junctionC, 1);
});

test('air far slower or faster than was checked – the solution – says so', () => {
  const model = buildBoardModel(row(0), { cellMm: 2 });
  const codes = (speedMPerS: number) =>
    solveCondition(
      model,
      { ...model.board.conditions[0]!, air: { kind: 'moving', speedMPerS, towardDeg: 0 } },
      { regulatorsW: new Map([['U20', 1]]), sourcesW: new Map() },
    ).notices.map(({ code }) => code);
  expect(codes(0.1)).toContain('slow-air');
  expect(codes(1)).toEqual([]);
  expect(codes(20)).toEqual(['fast-air']);
});

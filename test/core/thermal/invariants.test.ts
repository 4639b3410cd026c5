import { expect, test } from 'vitest';
import type { Board } from '#core/board/document.ts';
import { checkBoard } from '#core/check/check-board.ts';
import { buildBoardModel, type BoardModel } from '#core/thermal/board-model.ts';
import { BoardTooLarge } from '#core/thermal/cell-grid.ts';
import { solveCondition } from '#core/thermal/solve-condition.ts';
import { fr4, publishedBoard, rectangle } from '../../cases/board-of.ts';

/** Two parts on a board with a plane, a pour and vias; a fixed film unless it is given away. */
function twoParts(filmWPerM2K: number | undefined): Board {
  const board = publishedBoard({
    bodyMm: [4, 4, 1],
    caseTopKPerW: 40,
    lands: [
      { name: 'tab', kind: 'tab', kPerW: 5, pads: [{ at: [0, 0], sizeMm: [3, 3] }] },
      { name: 'lead', kind: 'lead', kPerW: 60, pads: [{ at: [0, -3], sizeMm: [2, 1] }] },
    ],
    outline: { points: rectangle(40, 24, [20, 12]) },
    stackup: {
      copper: [
        { name: 'L1', thicknessUm: 35 },
        { name: 'L2', thicknessUm: 18, plane: { net: 'PWR', coverage: 1, insetMm: 0.5 } },
        { name: 'L3', thicknessUm: 35 },
      ],
      dielectric: [fr4(0.3), fr4(1.2)],
      maxOperatingC: 130,
    },
    pours: [
      { id: 'p1', layer: 'L1', net: 'T', points: rectangle(12, 10, [11, 12]) },
      { id: 'p3', layer: 'L3', net: 'T', points: rectangle(14, 14, [11, 12]) },
    ],
    viaFields: [
      {
        id: 'v1',
        net: 'T',
        at: [11, 15],
        columns: 3,
        rows: 2,
        pitchMm: 1.2,
        drillMm: 0.3,
        platingUm: 25,
        filling: 'open',
        from: 'L1',
        to: 'L3',
      },
    ],
    at: [11, 12],
    filmWPerM2K,
  });
  const [first] = board.regulators;
  return { ...board, regulators: [first!, { ...first!, ref: 'U2', at: [30, 9], rotationDeg: 90 }] };
}

const solve = (model: BoardModel, first: number, second: number) =>
  solveCondition(model, model.board.conditions[0]!, {
    regulatorsW: new Map([
      ['U1', first],
      ['U2', second],
    ]),
    sourcesW: new Map(),
  });
const riseOf = (solution: ReturnType<typeof solve>, ref: string) => solution.regulators.get(ref)!.junctionC - 25;

test('heat – in and out – balance to 1e-6 with films that depend on the temperature', () => {
  const solution = solve(buildBoardModel(twoParts(undefined), { cellMm: 0.5 }), 1.1, 0.4);
  expect(solution.status).toBe('converged');
  expect(solution.energy.imbalance).toBeLessThan(1e-6);
  expect(solution.energy.inW).toBeCloseTo(1.5, 12);
  expect(solution.solver.residual).toBeLessThan(1e-8);
});

test('fixed films – rises – are reciprocal, additive and proportional', () => {
  const model = buildBoardModel(twoParts(12), { cellMm: 0.5 });
  const [one, other, both, triple] = [solve(model, 1, 0), solve(model, 0, 1), solve(model, 1, 1), solve(model, 3, 0)];
  // The solver's tolerance is 1e-9 of the whole; 1e-6 leaves room for the smaller of two rises.
  expect(riseOf(one, 'U2') / riseOf(other, 'U1')).toBeCloseTo(1, 6);
  expect(riseOf(both, 'U1') / (riseOf(one, 'U1') + riseOf(other, 'U1'))).toBeCloseTo(1, 6);
  expect(riseOf(triple, 'U1') / riseOf(one, 'U1')).toBeCloseTo(3, 6);
});

test('ledger – of one junction – sums to its rise; the parts of its ladder too', () => {
  const solution = solve(buildBoardModel(twoParts(undefined), { cellMm: 0.5 }), 0.8, 0.5);
  for (const [ref, heat] of solution.regulators) {
    const rise = heat.junctionC - 25;
    const sum = solution.ledger.filter(({ victim }) => victim === ref).reduce((total, { riseK }) => total + riseK, 0);
    expect(sum).toBeCloseTo(rise, 3);
    expect(heat.boxK + heat.preheatedAirK + heat.neighboursK + heat.boardK + heat.packageK).toBeCloseTo(rise, 6);
  }
});

test('no heat – everything – is at ambient; with heat nothing is below it', () => {
  const model = buildBoardModel(twoParts(undefined), { cellMm: 1 });
  expect(solve(model, 0, 0).board.maxC).toBeCloseTo(25, 9);
  const cells = solve(model, 1, 0).field.layers.flatMap(({ temperatureC }) => [...temperatureC]);
  expect(Math.min(...cells.filter((value) => Number.isFinite(value)))).toBeGreaterThanOrEqual(25);
});

test('a board – mirrored in x – gives the same junctions', () => {
  const board = twoParts(undefined);
  const mirror = ([x, y]: readonly [number, number]): [number, number] => [40 - x, y];
  const mirrored: Board = {
    ...board,
    pours: board.pours.map((pour) => ({ ...pour, points: pour.points.map(mirror) })),
    viaFields: board.viaFields.map((via) => ({ ...via, at: mirror(via.at) })),
    regulators: board.regulators.map((regulator) => ({
      ...regulator,
      at: mirror(regulator.at),
      rotationDeg: -regulator.rotationDeg,
    })),
  };
  const [one, other] = [board, mirrored].map((given) => solve(buildBoardModel(given, { cellMm: 0.5 }), 1, 0.5));
  // Sub-cells on the edge of a shape may fall to either side; the films settle within 0.003 K.
  for (const ref of ['U1', 'U2'])
    expect(Math.abs(riseOf(one!, ref) - riseOf(other!, ref)) / riseOf(one!, ref)).toBeLessThan(2e-3);
});

test('copper of another net below a tab – against the same net – cools it less', () => {
  const board = twoParts(undefined);
  const foreign: Board = {
    ...board,
    pours: board.pours.map((pour) => (pour.id === 'p3' ? { ...pour, net: 'OTHER' } : pour)),
  };
  const [joined, parted] = [board, foreign].map((given) =>
    riseOf(solve(buildBoardModel(given, { cellMm: 0.5 }), 1, 0), 'U1'),
  );
  expect(parted).toBeGreaterThan(joined! + 0.2);
});

test('surroundings – moving air, a stopped fan, altitude – act the way they must', () => {
  const board = twoParts(undefined);
  const [still] = board.conditions;
  const moving = { ...still!, air: { kind: 'moving' as const, speedMPerS: 2, towardDeg: 0 } };
  const conditions = [
    still!,
    { ...moving, name: 'moving' },
    { ...moving, name: 'stopped', fault: { kind: 'fan-stopped' as const } },
    { ...still!, name: 'high', altitudeM: 3000 },
    { ...still!, name: 'box', boxRiseK: 10 },
  ];
  const { result } = checkBoard({ ...board, conditions }, [], { cellMm: 1 });
  const [a, b, c, d, e] = result.conditions.map((condition) => condition.regulators[0]!.junctionC!);
  expect(b).toBeLessThan(a!);
  expect(c).toBeCloseTo(a!, 2);
  expect(d).toBeGreaterThan(a!);
  expect(e! - a!).toBeGreaterThan(8);
  expect(e! - a!).toBeLessThan(10.001);
});

test('cells – far too small for the board – are refused with the stated maximum', () => {
  expect(() => buildBoardModel(twoParts(10), { cellMm: 0.005 })).toThrow(BoardTooLarge);
});

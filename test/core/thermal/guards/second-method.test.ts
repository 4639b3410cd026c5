import { expect, test } from 'vitest';
import { factorDense, solveDense } from '#core/numerics/dense-cholesky.ts';
import { multiply } from '#core/numerics/layered-network.ts';
import { buildBoardModel, type BoardModel } from '#core/thermal/board-model.ts';
import { rightSide, solveRises } from '#core/thermal/solve-rises.ts';
import { publishedBoard, rectangle } from '#test/cases/board-of.ts';
import { assembledDiagonal } from './assembled-system.ts';
import { hardBoard } from './hard-board.ts';
import { heatOf, solved } from './solved-board.ts';

/** Matrix of a model as it stands, dense, column by column. */
function denseMatrix(model: BoardModel): Float64Array {
  const diagonal = assembledDiagonal(model);
  const n = diagonal.length;
  const dense = new Float64Array(n * n);
  const [unit, column] = [new Float64Array(n), new Float64Array(n)];
  for (let k = 0; k < n; k++) {
    unit[k] = 1;
    multiply(model.network, diagonal, unit, column);
    dense.set(column, k * n);
    unit[k] = 0;
  }
  return dense;
}

test.each([
  ['three layers, cells of 1.6 mm', hardBoard(), 1.6],
  ['a cut-out through the middle', { ...hardBoard(), outline: cutOutline() }, 2],
] as const)(
  '%s – at most 2000 unknowns by Cholesky elimination – within 1e-6 K of the iteration',
  (_, board, cellMm) => {
    const model = buildBoardModel(board, { cellMm });
    const heat = heatOf(board, { U1: 0.9, U2: 0.3, Q1: 0.2 });
    const { rise, ambientK, status } = solveRises(model, board.conditions[0]!, heat);
    expect(status).toBe('converged');
    expect(rise.length).toBeLessThan(2000);
    const dense = denseMatrix(model);
    for (let i = 0; i < rise.length; i++) {
      for (let j = 0; j < i; j++) expect(dense[i * rise.length + j]).toBe(dense[j * rise.length + i]);
    }
    const direct = rightSide(model, heat, ambientK);
    expect(factorDense(dense, rise.length)).toBe(true);
    solveDense(dense, rise.length, direct);
    rise.forEach((value, node) => expect(Math.abs(value - direct[node]!)).toBeLessThan(1e-6));
  },
);

function cutOutline() {
  return { points: hardBoard().outline.points, cutouts: [rectangle(3, 12, [16, 11])] };
}

/*
 * A part on a board so small and so well conducting that it has one temperature: junction to land and board in one branch, to the
 * case top in another, both to the air. Two parts: the board's node is shared.
 */
const small = publishedBoard({
  bodyMm: [3, 3, 1],
  caseTopKPerW: 60,
  lands: [{ name: 'tab', kind: 'tab', kPerW: 8, pads: [{ at: [0, 0], sizeMm: [2, 2] }] }],
  outline: { points: rectangle(16, 10, [8, 5]) },
  stackup: {
    copper: [
      { name: 'L1', thicknessUm: 500 },
      { name: 'L2', thicknessUm: 500 },
    ],
    dielectric: [{ thicknessMm: 0.5, inPlaneWPerMK: 400, throughWPerMK: 400 }],
    maxOperatingC: 130,
  },
  pours: ['L1', 'L2'].map((layer) => ({ id: layer, layer, net: 'T', points: rectangle(16, 10, [8, 5]) })),
  at: [5, 5],
  filmWPerM2K: 10,
});
/** Areas in m²: case (top and four sides), both faces of the board less what bodies cover. */
const caseWPerK = 1 / (60 + 1 / (10 * (9 + 12) * 1e-6));
const boardWPerK = (bodies: number) => 10 * (2 * 160 - 9 * bodies) * 1e-6;

test('one part on a board of one temperature – junction – that of the network drawn by hand within 1 %', () => {
  // Spreading in the copper and the solder take a few tenths of a percent of the 8 K/W.
  const viaBoard = 1 / (8 + 1 / boardWPerK(1));
  expect(
    (solved(small, { U1: 0.5 }).regulators.get('U1')!.junctionC - 25) / (0.5 / (viaBoard + caseWPerK)),
  ).toBeCloseTo(1, 2);
});

test('two parts on a board of one temperature – one heated – both junctions as by hand within 1 %', () => {
  const [first] = small.regulators;
  const two = { ...small, regulators: [first!, { ...first!, ref: 'U2', at: [11, 5] as [number, number] }] };
  const solution = solved(two, { U1: 0.5, U2: 0 });
  // Board node: to the air, and through the second part's junction to its case.
  const second = 1 / (8 + 1 / caseWPerK);
  const node = 1 / (boardWPerK(2) + second);
  const junction = 0.5 / (1 / (8 + node) + caseWPerK);
  const board = (junction * node) / (8 + node);
  expect((solution.regulators.get('U1')!.junctionC - 25) / junction).toBeCloseTo(1, 2);
  expect((solution.regulators.get('U2')!.junctionC - 25) / ((board / caseWPerK) * second)).toBeCloseTo(1, 2);
});

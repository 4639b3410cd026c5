import { expect, test } from 'vitest';
import type { Board } from '#core/board/document.ts';
import { buildBoardModel, type BoardModel } from '#core/thermal/board-model.ts';
import { copperWPerMK } from '#core/thermal/materials.ts';
import { solveLinear, solveRises } from '#core/thermal/solve-rises.ts';
import { publishedBoard, rectangle } from '#test/cases/board-of.ts';

/*
 * Method of manufactured solutions (Roache; Sandia report SAND2000-1444): a smooth field is chosen, the heat that it needs follows by
 * arithmetic, the solver gets that heat and must come ever nearer to the field, by the square of the cell: order 2 ± 0.2.
 *
 * A sheet of length a and width b: −∇·(G ∇T) + h·T = q, insulated at its edges, which T = cos(πx/a)·cos(2πy/b) + 2 fulfils.
 */
const [a, b] = [40, 24];
const laminate = { thicknessMm: 0.4, inPlaneWPerMK: 0.8, throughWPerMK: 0.3 };

function sheet(pours: Board['pours']): Board {
  const base = publishedBoard({
    bodyMm: [1, 1, 1],
    caseTopKPerW: 1,
    lands: [{ name: 'x', kind: 'lead', kPerW: 1, pads: [{ at: [0, 0], sizeMm: [1, 1] }] }],
    outline: { points: rectangle(a, b, [a / 2, b / 2]) },
    stackup: {
      copper: [
        { name: 'L1', thicknessUm: 35 },
        { name: 'L2', thicknessUm: 70 },
      ],
      dielectric: [laminate],
      maxOperatingC: 130,
    },
    filmWPerM2K: 15,
  });
  return { ...base, regulators: [], pours };
}

const pour = (id: string, layer: string, points: [number, number][]): Board['pours'][number] => ({
  id,
  layer,
  net: 'T',
  points,
  holes: [],
  coverage: 1,
  emissivity: null,
});
const whole = (layer: string) => pour(layer, layer, rectangle(a, b, [a / 2, b / 2]));

type Field = (x: number, y: number, layer: number) => number;

/** Root mean square and largest distance from the field, K; `filmOf` may change the film of a place, W/(m²·K). */
function distance(model: BoardModel, field: Field, heat: Field, filmOf?: (x: number, y: number) => number) {
  const { network, grid, layers, board } = model;
  const { films } = solveRises(model, board.conditions[0]!, { regulatorsW: new Map(), sourcesW: new Map() });
  const area = grid.dxMm * grid.dyMm * 1e-6;
  const centre = (cell: number): [number, number] => [
    ((cell % grid.columns) + 0.5) * grid.dxMm,
    (Math.floor(cell / grid.columns) + 0.5) * grid.dyMm,
  ];
  const right = new Float64Array(network.anchor.length);
  for (let cell = 0; cell < grid.columns * grid.rows; cell++) {
    const [x, y] = centre(cell);
    for (let layer = 0; layer < layers.count; layer++) right[cell * layers.count + layer] = heat(x, y, layer) * area;
    // The bottom's film is taken off where the place decides, so that a varying one is seen.
    if (filmOf) right[cell * layers.count]! += (filmAt - filmOf(x, y)) * field(x, y, 0) * area;
  }
  const answer = new Float64Array(right.length);
  expect(solveLinear(model, films, right, answer, { tolerance: 1e-9 }).status).toBe('converged');
  let [square, most] = [0, 0];
  answer.forEach((value, node) => {
    const [x, y] = centre(Math.floor(node / layers.count));
    const apart = value - field(x, y, node % layers.count);
    square += apart * apart;
    most = Math.max(most, Math.abs(apart));
  });
  return { rms: Math.sqrt(square / answer.length), most };
}

const filmAt = 15;
const sheetOf = (thicknessUm: number) => copperWPerMK * thicknessUm * 1e-6 + (0.8 * 0.4e-3) / 2;
const exchange = 0.3 / 0.4e-3;
const [kx, ky] = [Math.PI / (a * 1e-3), (2 * Math.PI) / (b * 1e-3)];
const wave = (x: number, y: number) => Math.cos(kx * x * 1e-3) * Math.cos(ky * y * 1e-3);
/** Order between two cells of which the second is half the first. */
const order = (coarse: number, fine: number) => Math.log2(coarse / fine);

test('two coupled layers, insulated edges, a film on each face – cells halved – second order', () => {
  // T1 = 2 + w, T2 = 1 − 0.4·w; heat of each layer: G·(kx² + ky²)·(T's wave) + film·T + exchange·(T − other T).
  const field: Field = (x, y, layer) => (layer === 0 ? 2 + wave(x, y) : 1 - 0.4 * wave(x, y));
  const heat: Field = (x, y, layer) => {
    const waving = (kx * kx + ky * ky) * (layer === 0 ? 1 : -0.4) * wave(x, y);
    const own = field(x, y, layer);
    return sheetOf(layer === 0 ? 35 : 70) * waving + filmAt * own + exchange * (own - field(x, y, 1 - layer));
  };
  const board = sheet([whole('L1'), whole('L2')]);
  const errors = [2, 1, 0.5].map((cellMm) => distance(buildBoardModel(board, { cellMm }), field, heat));
  expect(order(errors[1]!.rms, errors[2]!.rms)).toBeGreaterThan(1.8);
  expect(order(errors[1]!.rms, errors[2]!.rms)).toBeLessThan(2.2);
  expect(order(errors[1]!.most, errors[2]!.most)).toBeGreaterThan(1.8);
  expect(order(errors[0]!.rms, errors[1]!.rms)).toBeGreaterThan(1.7);
});

/** Sheet conductance of both layers where there is copper on both, and where there is none, W/K. */
const [dense, bare] = [sheetOf(35) + sheetOf(70), 0.8 * 0.4e-3];

/*
 * Copper on x < c only, so that the conductance jumps by a factor of 130 at c. Along x, one temperature through the board:
 * T = 1 + cos(πx/c')… is chosen piecewise with one temperature and one flux at c, and no flux at either edge:
 * left T = A − p·x²/2, right T = B + r·(a − x)²/2, with G1·p·c = G2·r·(a − c) and equal T at c.
 */
test.each([
  ['on a line of the cells', 20],
  ['within a cell of every grid', 20.25],
])('copper that ends %s – cells halved – second order in the mean, at least first everywhere', (_, c) => {
  const board = {
    ...sheet(['L1', 'L2'].map((layer) => pour(layer, layer, rectangle(c, b, [c / 2, b / 2])))),
    stackup: {
      ...sheet([]).stackup,
      dielectric: [{ ...laminate, throughWPerMK: 500 }],
    },
  };
  const metres = 1e-3;
  const p = 2e3;
  const r = (dense * p * c) / (bare * (a - c));
  const edge = 30;
  const profile = (x: number) =>
    x < c
      ? edge + (p * (c * c - x * x) * metres * metres) / 2
      : edge + (r * ((a - x) ** 2 - (a - c) ** 2) * metres * metres) / 2;
  const field: Field = (x) => profile(x);
  // −G·T″ = G1·p on the left, −G2·r on the right; heat half in each layer; a cell that holds c gets its share of both.
  const source = (x: number, half: number) => {
    const left = Math.min(1, Math.max(0, (c - (x - half)) / (2 * half)));
    return left * dense * p - (1 - left) * bare * r;
  };
  const errors = [2, 1, 0.5].map((cellMm) => {
    const model = buildBoardModel(board, { cellMm });
    return distance(model, field, (x) => source(x, cellMm / 2) / 2 + filmAt * profile(x));
  });
  expect(order(errors[0]!.rms, errors[2]!.rms) / 2).toBeGreaterThan(1);
  expect(order(errors[0]!.most, errors[2]!.most) / 2).toBeGreaterThan(0.9);
});

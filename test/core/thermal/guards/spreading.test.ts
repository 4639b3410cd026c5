import { expect, test } from 'vitest';
import { boardDocument, type Board } from '#core/board/document.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { cellWeights } from '#core/thermal/cell-weights.ts';
import { buildCopperMap } from '#core/thermal/copper-map.ts';
import { copperWPerMK } from '#core/thermal/materials.ts';
import { solveLinear, solveRises } from '#core/thermal/solve-rises.ts';
import { publishedBoard, rectangle } from '#test/cases/board-of.ts';
import { solved } from './solved-board.ts';

/** A board of sources alone: two layers of 35 µm all copper, laminate that makes one sheet of them, the same film on both faces. */
function sheet(outline: [number, number][], sources: Board['sources'], film: number, throughWPerMK = 100): Board {
  const base = publishedBoard({
    bodyMm: [1, 1, 1],
    caseTopKPerW: 1,
    lands: [{ name: 'x', kind: 'lead', kPerW: 1, pads: [{ at: [0, 0], sizeMm: [1, 1] }] }],
    outline: { points: outline },
    stackup: {
      copper: ['L1', 'L2'].map((name) => ({ name, thicknessUm: 35, plane: { net: 'T' } })),
      dielectric: [{ thicknessMm: 0.5, inPlaneWPerMK: 0.8, throughWPerMK }],
      maxOperatingC: 130,
    },
    filmWPerM2K: film,
  });
  return boardDocument.parse({ ...base, regulators: [], sources });
}
const conductance = 2 * copperWPerMK * 35e-6 + 0.8 * 0.5e-3;
const source = (at: [number, number], sizeMm: [number, number]): Board['sources'][number] => ({
  ref: 'Q',
  at,
  sizeMm,
  bodyMm: null,
  rotationDeg: 0,
  side: 'top',
  powerW: 1,
  limitC: null,
});

test('uniform heat and film on all of a board – rise – P ÷ (h·A) to 1e-9', () => {
  const board = sheet(rectangle(30, 18, [15, 9]), [source([15, 9], [30, 18])], 11);
  const { regulators, sources, board: found } = solved(board, { Q: 0.7 });
  expect(regulators.size).toBe(0);
  const rise = 0.7 / (11 * 2 * 540e-6);
  expect(Math.abs((found.meanC - 25) / rise - 1)).toBeLessThan(1e-9);
  // Half of it crosses the laminate to the other face: 0.35 W through 0.5 mm of 100 W/(m·K).
  const across = (0.35 * 0.5e-3) / (100 * 540e-6);
  expect(Math.abs((sources.get('Q')!.meanC - 25 - rise) / (across / 2) - 1)).toBeLessThan(1e-3);
});

test('slabs in series – a board cooled below alone – the sum of its slabs and film to 1e-9', () => {
  const base = sheet(rectangle(20, 20, [10, 10]), [source([10, 10], [20, 20])], 30);
  const layered: Board = {
    ...base,
    stackup: {
      ...base.stackup,
      copper: ['L1', 'L2', 'L3', 'L4'].map((name) => ({ ...base.stackup.copper[0]!, name })),
      dielectric: [
        { thicknessMm: 0.2, inPlaneWPerMK: 1, throughWPerMK: 0.3 },
        { thicknessMm: 2.9, inPlaneWPerMK: 1, throughWPerMK: 0.7 },
        { thicknessMm: 0.1, inPlaneWPerMK: 1, throughWPerMK: 0.05 },
      ],
    },
    conditions: base.conditions.map((condition) => ({ ...condition, filmWPerM2K: { top: 6, bottom: 30 } })),
  };
  const slabs = 0.2e-3 / 0.3 + 2.9e-3 / 0.7 + 0.1e-3 / 0.05;
  const top = 1 / 400e-6 / (6 + 1 / (slabs + 1 / 30));
  expect(Math.abs((solved(layered, { Q: 1 }).sources.get('Q')!.meanC - 25) / top - 1)).toBeLessThan(1e-9);
});

test('a strip heated over one end – a straight fin with an insulated tip – rise along it within 0.1 %', () => {
  // T'' = m²·T, m² = 2·h ÷ G; heat on the first 10 of 60 mm: two cosh pieces with one value and one slope between them.
  const [length, heated, width, film] = [60e-3, 10e-3, 4e-3, 25];
  const board = sheet(rectangle(60, 4, [30, 2]), [source([5, 2], [10, 4])], film);
  const model = buildBoardModel(board, { cellMm: 0.5 });
  const { rise } = solveRises(model, board.conditions[0]!, { regulatorsW: new Map(), sourcesW: new Map([['Q', 1]]) });
  const m = Math.sqrt((2 * film) / conductance);
  const flat = 1 / (2 * film * heated * width);
  const inside = (flat * Math.sinh(m * (length - heated))) / Math.sinh(m * length);
  const exact = (x: number) =>
    x <= heated
      ? flat - inside * Math.cosh(m * x)
      : (flat * Math.sinh(m * heated) * Math.cosh(m * (length - x))) / Math.sinh(m * length);
  for (let i = 0; i < model.grid.columns; i++) {
    const x = (i + 0.5) * model.grid.dxMm * 1e-3;
    const cell = 3 * model.grid.columns + i;
    const mean = (rise[cell * model.layers.count]! + rise[cell * model.layers.count + 1]!) / 2;
    expect(Math.abs(mean / exact(x) - 1), `${x}`).toBeLessThan(1e-3);
  }
});

/** Modified Bessel functions of order 0 and 1 by their integrals, midpoints: I and K. */
const steps = 4000;
const besselI = (order: number, z: number) =>
  Array.from({ length: steps }, (_, k) => ((k + 0.5) * Math.PI) / steps).reduce(
    (sum, t) => sum + Math.exp(z * Math.cos(t)) * Math.cos(order * t),
    0,
  ) / steps;
const besselK = (order: number, z: number) =>
  Array.from({ length: steps }, (_, k) => ((k + 0.5) * 12) / steps).reduce(
    (sum, t) => sum + Math.exp(-z * Math.cosh(t)) * Math.cosh(order * t),
    0,
  ) *
  (12 / steps);

test('a round board heated over a disc in its middle – rises of disc and rim – Bessel functions within 1 %', () => {
  // Radius 20 mm, heat on 6 mm; inside T = q/H + c·I0(mr), outside d·(I0(mr) + K0(mr)·I1(mR)/K1(mR)), no flux at the rim.
  const ring = (radius: number): [number, number][] =>
    Array.from({ length: 180 }, (_, k) => [
      radius * Math.cos((k * Math.PI) / 90),
      radius * Math.sin((k * Math.PI) / 90),
    ]);
  const film = 14;
  const board = sheet(ring(20), [], film);
  const model = buildBoardModel(board, { cellMm: 0.5 });
  const { films } = solveRises(model, board.conditions[0]!, { regulatorsW: new Map(), sourcesW: new Map() });
  const disc = cellWeights(buildCopperMap(board, model.grid), [ring(6)]);
  const right = new Float64Array(model.network.anchor.length);
  disc.cell.forEach((cell, k) => (right[cell * model.layers.count] = disc.weight[k]!));
  const rise = new Float64Array(right.length);
  expect(solveLinear(model, films, right, rise, { tolerance: 1e-10 }).status).toBe('converged');
  const m = Math.sqrt((2 * film) / conductance);
  const [a, b] = [6e-3, 20e-3];
  const flat = 1 / (2 * film * Math.PI * a * a);
  const ratio = besselI(1, m * b) / besselK(1, m * b);
  const [value, slope] = [besselI(0, m * a) + ratio * besselK(0, m * a), besselI(1, m * a) - ratio * besselK(1, m * a)];
  // flat + c·I0 = d·value and c·I1 = d·slope.
  const d = flat / (value - (slope * besselI(0, m * a)) / besselI(1, m * a));
  const c = (d * slope) / besselI(1, m * a);
  const mean = flat + (c * 2 * besselI(1, m * a)) / (m * a);
  const rim = d * (besselI(0, m * b) + ratio * besselK(0, m * b));
  let found = 0;
  disc.cell.forEach((cell, k) => (found += disc.weight[k]! * rise[cell * model.layers.count]!));
  expect(Math.abs(found / mean - 1)).toBeLessThan(0.01);
  const edge = Math.floor(model.grid.rows / 2) * model.grid.columns;
  expect(Math.abs(rise[edge * model.layers.count]! / rim - 1)).toBeLessThan(0.01);
});

test('a rectangle off the middle of a rectangular sheet – mean and peak – the double cosine series within 1 and 2 %', () => {
  // G·∇²T − H·T + q = 0, insulated edges: T = Σ q_mn·cos(mπx/a)·cos(nπy/b) ÷ (G·k² + H), 200 × 200 terms.
  const [a, b, film] = [50e-3, 30e-3, 12];
  const [cx, cy, w, h] = [12e-3, 9e-3, 8e-3, 5e-3];
  const board = sheet(rectangle(50, 30, [25, 15]), [source([12, 9], [8, 5])], film);
  const { sources } = solved(board, { Q: 1 }, {}, 0.5);
  const shape = (k: number, centre: number, size: number, length: number) => {
    const wave = (k * Math.PI) / length;
    return k === 0 ? 1 : (Math.cos(wave * centre) * Math.sin((wave * size) / 2)) / ((wave * size) / 2);
  };
  let [mean, centre] = [0, 0];
  for (let i = 0; i < 200; i++) {
    for (let j = 0; j < 200; j++) {
      const [x, y] = [shape(i, cx, w, a), shape(j, cy, h, b)];
      const waves = ((i * Math.PI) / a) ** 2 + ((j * Math.PI) / b) ** 2;
      const weight = ((i ? 2 : 1) * (j ? 2 : 1)) / (a * b) / (conductance * waves + 2 * film);
      mean += weight * x * x * y * y;
      centre += weight * x * y * Math.cos((i * Math.PI * cx) / a) * Math.cos((j * Math.PI * cy) / b);
    }
  }
  const found = sources.get('Q')!;
  expect(Math.abs((found.meanC - 25) / mean - 1)).toBeLessThan(0.01);
  expect(Math.abs((found.maxC - 25) / centre - 1)).toBeLessThan(0.02);
});

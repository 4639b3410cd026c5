import { expect, test } from 'vitest';
import type { Condition } from '#core/board/condition.ts';
import { conductanceSums, multiply } from '#core/numerics/layered-network.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { solveRises } from '#core/thermal/solve-rises.ts';
import { assembledDiagonal } from './assembled-system.ts';
import { hardBoard } from './hard-board.ts';
import { heatOf, tightRises } from './solved-board.ts';

const cutOut = () => {
  const board = hardBoard({ sinks: [] });
  const hole: [number, number][] = [
    [14, 8],
    [18, 8],
    [18, 16],
    [14, 16],
  ];
  return { ...board, outline: { ...board.outline, cutouts: [hole] } };
};

test.each([0.4, 1, 3])('assembled matrix, cells of %d mm – its signs – are those of an M-matrix', (cellMm) => {
  const board = cutOut();
  const model = buildBoardModel(board, { cellMm });
  solveRises(model, board.conditions[0]!, heatOf(board, { U1: 1 }));
  const { network } = model;
  for (const g of [network.gx, network.gy, network.gz, network.links.g]) {
    for (const value of g) expect(value).toBeGreaterThanOrEqual(0);
  }
  // Off-diagonals are minus these; a row sum is the anchor: none below zero and at least one above.
  const diagonal = assembledDiagonal(model);
  const sums = new Float64Array(diagonal.length);
  multiply(network, diagonal, new Float64Array(diagonal.length).fill(1), sums);
  const inner = conductanceSums(network);
  sums.forEach((sum, node) => {
    expect(diagonal[node]).toBeGreaterThan(0);
    const alone = inner[node] === 0 && network.anchor[node] === 0;
    expect(Math.abs(sum - (alone ? 1 : network.anchor[node]!))).toBeLessThan(1e-12 * diagonal[node]!);
    expect(network.anchor[node]).toBeGreaterThanOrEqual(0);
  });
  expect(network.anchor.some((anchor) => anchor > 0)).toBe(true);
});

test('conductances at the far edges of the grid – nothing – so that no cell leaks into the next row', () => {
  const { network } = buildBoardModel(cutOut(), { cellMm: 1 });
  const { columns, rows, layers, gx, gy, gz } = network;
  gx.forEach((value, node) => {
    const cell = Math.floor(node / layers);
    if (cell % columns === columns - 1) expect(value).toBe(0);
    if (Math.floor(cell / columns) === rows - 1) expect(gy[node]).toBe(0);
    if (node % layers === layers - 1) expect(gz[node]).toBe(0);
  });
});

const airs: [string, Partial<Condition>][] = [
  ['still air', {}],
  ['upright at 4000 m', { orientation: 'vertical', altitudeM: 4000 }],
  ['a fixed film', { filmWPerM2K: 7 }],
];

test.each(airs)('%s – no heat and every sink at ambient – everything at ambient', (_, change) => {
  const board = cutOut();
  const model = buildBoardModel(board, { cellMm: 1 });
  for (const rise of tightRises(model, { U1: 0, U2: 0, Q1: 0 }, change)) expect(Math.abs(rise)).toBeLessThan(1e-9);
});

test.each(airs)('%s – heat in one part – nothing is below ambient, and nothing above its junction', (_, change) => {
  const board = cutOut();
  const model = buildBoardModel(board, { cellMm: 1 });
  const rises = tightRises(model, { U2: 0.8 }, change);
  const hottest = rises[model.packages.find(({ ref }) => ref === 'U2')!.junction]!;
  rises.forEach((rise, node) => {
    expect(rise).toBeGreaterThanOrEqual(-1e-9);
    if (model.network.anchor[node]! > 0) expect(rise).toBeGreaterThan(0);
    expect(rise).toBeLessThanOrEqual(hottest + 1e-9);
  });
});

test('heat on a source – the warmest cell – is one of its own', () => {
  const board = cutOut();
  const model = buildBoardModel(board, { cellMm: 0.5 });
  const rises = tightRises(model, { Q1: 0.8 });
  const warmest = rises.indexOf(Math.max(...rises));
  expect([...model.sources[0]!.weights.cell]).toContain(Math.floor(warmest / model.layers.count));
});

test('a sink colder than the air – without heat – the board between the two', () => {
  const board = hardBoard({
    sinks: [{ id: 's1', at: [16, 10], sizeMm: [4, 4], layer: 'L1', conductanceWPerK: 0.05, toC: 5 }],
  });
  const rises = tightRises(buildBoardModel(board, { cellMm: 1 }), { U1: 0, U2: 0, Q1: 0 });
  expect(Math.max(...rises)).toBeLessThan(1e-9);
  expect(Math.min(...rises)).toBeGreaterThan(-20);
  expect(Math.min(...rises)).toBeLessThan(-3);
});

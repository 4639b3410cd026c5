import { expect, test } from 'vitest';
import type { Board } from '#core/board/document.ts';
import { boardLayers } from '#core/thermal/board-layers.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { buildCellGrid } from '#core/thermal/cell-grid.ts';
import { buildCopperMap } from '#core/thermal/copper-map.ts';
import { copperWPerMK } from '#core/thermal/materials.ts';
import { barrelConductanceLength } from '#core/thermal/via-conductance.ts';
import { viaPairs } from '#core/thermal/via-pairs.ts';
import { rectangle } from '#test/cases/board-of.ts';
import { hardBoard } from './hard-board.ts';

const board = hardBoard();

/** Sheet of a layer at a point, W/K, and whether there is board. */
function reader(given: Board, cellMm = 0.5) {
  const grid = buildCellGrid(given, cellMm, 4);
  const map = buildCopperMap(given, grid);
  const columns = grid.columns * grid.split;
  const at = (x: number, y: number) =>
    Math.floor((y / grid.dyMm) * grid.split) * columns + Math.floor((x / grid.dxMm) * grid.split);
  return {
    sheet: (layer: number, x: number, y: number) => map.layers[layer]!.sheet[at(x, y)]!,
    inside: (x: number, y: number) => map.inside[at(x, y)] === 1,
  };
}

test('a pour with a slot – its sheet – is k·t on copper and nothing in the slot and beside it', () => {
  const { sheet } = reader(board);
  expect(sheet(0, 4, 7)).toBeCloseTo(copperWPerMK * 35e-6, 9);
  expect(sheet(0, 11, 10)).toBe(0);
  expect(sheet(0, 16, 10)).toBe(0);
});

test('a plane – beside a pour and a via of other nets, and at the edge – keeps its clearance and its inset', () => {
  const pour = {
    ...board.pours[0]!,
    id: 'island',
    layer: 'L2',
    net: 'OTHER',
    points: rectangle(4, 4, [22, 10]),
    holes: [],
  };
  const { sheet } = reader({ ...board, pours: [...board.pours, pour] });
  const plane = copperWPerMK * 18e-6;
  // The island reaches to x = 24; 0.2 mm are kept free, a sub-cell of 0.125 mm is the raster.
  expect(sheet(1, 22, 10)).toBeCloseTo(plane, 9);
  expect(sheet(1, 24.06, 10)).toBe(0);
  expect(sheet(1, 24.4, 10)).toBeCloseTo(plane, 9);
  // Via of net T at (8, 12.7): drill 0.3 mm and 25 µm of plating.
  expect(sheet(1, 8.25, 12.7)).toBe(0);
  expect(sheet(1, 8.25, 10.1)).toBeCloseTo(plane, 9);
  expect(sheet(1, 0.5, 10)).toBe(0);
  expect(sheet(1, 1.3, 10)).toBeCloseTo(plane, 9);
});

test('a cut-out – board and copper – are not there, in the shares of the cells too', () => {
  const cutout = rectangle(6, 4, [9, 10]);
  const given = { ...board, outline: { ...board.outline, cutouts: [cutout] } };
  const { sheet, inside } = reader(given);
  expect([inside(9, 10), inside(5.5, 10)]).toEqual([false, true]);
  expect(sheet(0, 9, 10)).toBe(0);
  const { filled, grid } = buildBoardModel(given, { cellMm: 1 });
  const areaMm2 = filled.reduce((sum, share) => sum + share, 0) * grid.dxMm * grid.dyMm;
  expect(areaMm2).toBeCloseTo(32 * 20 - 6 * 4, 6);
});

test('a pour of less coverage – its sheet – c ÷ (2 − c) of the full one', () => {
  const { sheet } = reader({ ...board, pours: [{ ...board.pours[1]!, coverage: 0.5 }] });
  expect(sheet(2, 5, 5)).toBeCloseTo((copperWPerMK * 70e-6) / 3, 9);
});

test('vias from the second layer to the third – each – as long as the laminate between the two', () => {
  const given: Board = {
    ...board,
    viaFields: board.viaFields.map((via) => ({ ...via, net: 'PWR', from: 'L2', to: 'L3' })),
    pours: board.pours.map((pour) => ({ ...pour, net: 'PWR' })),
  };
  const layers = boardLayers(given);
  const pairs = viaPairs(given, buildCopperMap(given, buildCellGrid(given, 0.5, layers.count)), layers);
  expect(pairs).toHaveLength(6);
  for (const { g } of pairs) expect(g).toBeCloseTo(barrelConductanceLength(given.viaFields[0]!) / 1.2e-3, 12);
});

test('vias of a net through a plane of another – each – from pour to pour in one piece', () => {
  const layers = boardLayers(board);
  const pairs = viaPairs(board, buildCopperMap(board, buildCellGrid(board, 0.5, layers.count)), layers);
  expect(pairs).toHaveLength(6);
  for (const { g } of pairs) expect(g).toBeCloseTo(barrelConductanceLength(board.viaFields[0]!) / 1.45e-3, 12);
});

test('vias of one net between pours of another – pairs – none', () => {
  const given: Board = { ...board, pours: board.pours.map((pour) => ({ ...pour, net: 'OTHER' })), regulators: [] };
  const layers = boardLayers(given);
  expect(viaPairs(given, buildCopperMap(given, buildCellGrid(given, 0.5, layers.count)), layers)).toEqual([]);
});

test('a part – what leaves its junction – is every land, the gap under its body, and nothing else but the case top', () => {
  const { network, packages } = buildBoardModel(board, { cellMm: 0.5, correctLands: false });
  const { links } = network;
  for (const { junction } of packages) {
    let sum = 0;
    for (let k = links.start[junction]!; k < links.start[junction + 1]!; k++) sum += links.g[k]!;
    expect(sum).toBeCloseTo(1 / 5 + 1 / 60 + 1 / 200, 9);
  }
});

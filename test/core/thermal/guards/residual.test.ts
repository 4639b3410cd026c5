import { expect, test } from 'vitest';
import { multiply } from '#core/numerics/layered-network.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { rightSide, solveRises } from '#core/thermal/solve-rises.ts';
import { assembledDiagonal } from './assembled-system.ts';
import { hardBoard } from './hard-board.ts';
import { heatOf } from './solved-board.ts';

const powers = { U1: 0.9, U2: 0.3, Q1: 0.25 };
const norm = (v: Float64Array) => Math.sqrt(v.reduce((sum, value) => sum + value * value, 0));

test.each([1, 0.4])(
  'cells of %d mm – residual computed here from the answer – is the reported one and below 1e-8',
  (cellMm) => {
    const board = hardBoard();
    const model = buildBoardModel(board, { cellMm });
    const heat = heatOf(board, powers);
    const { rise, residual, ambientK } = solveRises(model, board.conditions[0]!, heat);
    const b = rightSide(model, heat, ambientK);
    const diagonal = assembledDiagonal(model);
    const left = new Float64Array(b.length);
    multiply(model.network, diagonal, rise, left);
    const own = norm(left.map((value, node) => b[node]! - value));
    expect(own / norm(b)).toBeLessThan(1e-8);
    // Rounding of a residual: 1e-16 of the terms that cancel in it.
    const rounding = 1e-15 * norm(rise.map((value, node) => value * diagonal[node]!));
    expect(Math.abs(residual * norm(b) - own)).toBeLessThan(0.01 * own + rounding);
    // Scaled by what cancels (Templates for the Solution of Linear Systems, 4.2: backward error) it is as small again.
    expect(own / (2 * Math.max(...diagonal) * norm(rise) + norm(b))).toBeLessThan(1e-9);
  },
);

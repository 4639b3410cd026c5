import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import type { Board } from '#core/board/document.ts';
import { matrixMarket, vectorMarket } from '#core/numerics/matrix-market.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { rightSide, solveRises } from '#core/thermal/solve-rises.ts';
import { pythonPath } from '#test/support/scipy.js';
import { assembledDiagonal } from './assembled-system.ts';
import { hardBoard } from './hard-board.ts';

const heat = {
  regulatorsW: new Map([
    ['U1', 0.9],
    ['U2', 0.35],
  ]),
  sourcesW: new Map([['Q1', 0.2]]),
};

/** The system as text, solved by SciPy's direct sparse LU (SuperLU) in a process of its own. */
function bySciPy(matrix: Iterable<string>, vector: Iterable<string>): number[] {
  const folder = mkdtempSync(join(tmpdir(), 'dropwatt-market-'));
  try {
    const [a, b] = [join(folder, 'a.mtx'), join(folder, 'b.mtx')];
    writeFileSync(a, [...matrix].join(''));
    writeFileSync(b, [...vector].join(''));
    const script = join(import.meta.dirname, '../../../support/solve-market.py');
    const { status, stdout, stderr } = spawnSync(pythonPath, [script, a, b], { encoding: 'utf8', maxBuffer: 2 ** 28 });
    expect(status, stderr).toBe(0);
    return stdout.trim().split('\n').map(Number);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** A second board, unlike the first: upright, one copper layer over a metal core, a wide range of conductivities. */
function metalCore(): Board {
  const board = hardBoard({ second: false, viaFields: [], sinks: [] });
  const [condition] = board.conditions;
  return {
    ...board,
    stackup: {
      ...board.stackup,
      copper: [
        { name: 'L1', thicknessUm: 105, plane: null, traces: { coverage: 0.3 } },
        { name: 'L3', thicknessUm: 1, plane: null, traces: null },
      ],
      dielectric: [{ thicknessMm: 1.6, inPlaneWPerMK: 180, throughWPerMK: 2 }],
    },
    conditions: [{ ...condition!, orientation: 'vertical', altitudeM: 2000 }],
  };
}

test.each([
  ['three layers, slot, vias, screw at 40 °C, still air', hardBoard()],
  ['one layer over metal, upright at 2000 m', metalCore()],
])('%s – the films as they settled – SciPy gives every node within 1e-6 K', (_, board) => {
  const model = buildBoardModel(board, { cellMm: 0.5 });
  const solved = solveRises(model, board.conditions[0]!, heat);
  expect(solved.status).toBe('converged');
  const answer = bySciPy(
    matrixMarket(model.network, assembledDiagonal(model)),
    vectorMarket(rightSide(model, heat, solved.ambientK)),
  );
  expect(answer).toHaveLength(solved.rise.length);
  expect(Math.max(...answer)).toBeGreaterThan(15);
  const apart = answer.reduce((most, value, node) => Math.max(most, Math.abs(value - solved.rise[node]!)), 0);
  expect(apart).toBeLessThan(1e-6);
});

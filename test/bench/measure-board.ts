import type { Board } from '#core/board/document.ts';
import { heatInput } from '#core/check/heat-input.ts';
import { operatingPoints } from '#core/electrical/operating-points.ts';
import { sourcePowers } from '#core/electrical/source-powers.ts';
import { conjugateGradients, conjugateWork } from '#core/numerics/conjugate-gradients.ts';
import { multiply } from '#core/numerics/layered-network.ts';
import { applyMultigrid, refreshMultigrid } from '#core/numerics/multigrid.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { linearTolerance, maximumIterations } from '#core/thermal/method.ts';
import { rightSide, solveRises } from '#core/thermal/solve-rises.ts';
import { jacobiConjugateGradients } from './jacobi-conjugate-gradients.ts';

export type BoardMeasurement = {
  board: string;
  unknowns: number;
  /** Model from the document, ms. */
  buildMs: number;
  /** Cold non-linear solution of the first condition, films included, ms. */
  solveMs: number;
  /** Buffers of the model and one solution, MB. */
  buffersMB: number;
  /** One linear solution with the films of that condition: ours and the yardstick's. */
  linearMs: number;
  yardstickMs: number;
  iterations: number;
  yardstickIterations: number;
  /** Largest difference of the two solutions, K. */
  differenceK: number;
};

const rounds = 5;

/** Times are medians of five rounds; the yardstick runs in the same minute on the same matrix, so that ratios last. */
export function measureBoard(board: Board): BoardMeasurement {
  const condition = board.conditions[0];
  if (!condition) throw new Error(`${board.title} has no condition to solve`);
  const points = operatingPoints(board, condition);
  const heat = heatInput(points, sourcePowers(board, condition, points));
  const model = buildBoardModel(board);
  const rises = solveRises(model, condition, heat);
  if (rises.status !== 'converged') throw new Error(`${board.title}: ${rises.message}`);

  // The model keeps the films of the last round: one fixed matrix for both methods.
  const { network, multigrid } = model;
  const { diagonal } = multigrid.levels[0]!;
  const b = rightSide(model, heat, rises.ambientK);
  const x = new Float64Array(b.length);
  const work = conjugateWork(b.length);
  const system = {
    multiply: (v: Float64Array, y: Float64Array) => multiply(network, diagonal, v, y),
    precondition: (r: Float64Array, z: Float64Array) => applyMultigrid(multigrid, r, z),
  };
  let iterations = 0;
  const linear = () => {
    refreshMultigrid(multigrid);
    x.fill(0);
    ({ iterations } = conjugateGradients(system, b, x, { tolerance: linearTolerance, maximumIterations, work }));
  };
  let yardstick: ReturnType<typeof jacobiConjugateGradients> = { x, iterations: 0 };
  const linearMs = medianMs(linear);
  const yardstickMs = medianMs(() => (yardstick = jacobiConjugateGradients(network, diagonal, b, linearTolerance)));
  return {
    board: board.title,
    unknowns: b.length,
    buildMs: medianMs(() => buildBoardModel(board)),
    solveMs: medianMs(() => solveRises(model, condition, heat)),
    buffersMB: bufferBytes([model, rises]) / 2 ** 20,
    linearMs,
    yardstickMs,
    iterations,
    yardstickIterations: yardstick.iterations,
    differenceK: x.reduce((most, value, k) => Math.max(most, Math.abs(value - yardstick.x[k]!)), 0),
  };
}

function medianMs(act: () => unknown): number {
  const times = Array.from({ length: rounds }, () => {
    const began = performance.now();
    act();
    return performance.now() - began;
  });
  return times.sort((a, b) => a - b)[Math.floor(rounds / 2)]!;
}

/** Bytes of all typed arrays that can be reached from a value, each buffer once. */
function bufferBytes(value: unknown, seen = new Set<unknown>()): number {
  if (typeof value !== 'object' || value === null || seen.has(value)) return 0;
  seen.add(value);
  if (ArrayBuffer.isView(value)) {
    if (seen.has(value.buffer)) return 0;
    seen.add(value.buffer);
    return value.buffer.byteLength;
  }
  return Object.values(value).reduce((sum: number, part) => sum + bufferBytes(part, seen), 0);
}

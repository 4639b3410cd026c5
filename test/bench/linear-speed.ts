import { networkSolver } from '#core/numerics/kernel/network-solver.ts';
import { solveRises } from '#core/thermal/solve-rises.ts';
import { hardModel } from './hard-model.ts';
import { median } from './median.ts';
import { writeSystem, type Reference } from './reference.ts';

export type LinearSpeed = {
  cellMm: number;
  unknowns: number;
  /** Cold solve to 1e-8 with set-up, ms: ours, the first of all, and the reference's. */
  oursMs: number;
  firstMs: number;
  referenceMs: number;
  iterations: number;
  referenceIterations: number;
  residual: number;
  /** Largest difference of the two temperatures, K. */
  differenceK: number;
  /** Cold non-linear solution, films included, ms. */
  nonlinearMs: number;
  /** Memory of the kernel, MB. */
  kernelMB: number;
};

const tolerance = 1e-8;

/** S1, S2, S4: interleaved rounds of our cold solve and the reference's on the same matrix, medians. */
export async function linearSpeed(
  reference: Reference,
  folder: string,
  cellMm: number,
  rounds: number,
): Promise<LinearSpeed> {
  const { model, heat, b } = hardModel(7001, 4, cellMm);
  const name = `cell-${cellMm}`;
  writeSystem(folder, name, model.network, b);
  const ours: number[] = [];
  const theirs: number[] = [];
  const nonlinear: number[] = [];
  let [iterations, residual, differenceK, kernelMB] = [0, NaN, NaN, NaN];
  let referenceIterations = 0;
  for (let round = 0; round < rounds; round++) {
    const x = new Float64Array(b.length);
    const began = performance.now();
    const solver = networkSolver(model.network);
    solver.refresh();
    const record = solver.solve(b, x, { tolerance, maximumIterations: 400 });
    ours.push(performance.now() - began);
    kernelMB = solver.bytes / 2 ** 20;
    solver.release();
    ({ iterations, residual } = record);
    const answer = await reference.solve(name, tolerance);
    theirs.push(1e3 * answer.seconds);
    referenceIterations = answer.iterations;
    differenceK = x.reduce((most, value, k) => Math.max(most, Math.abs(value - answer.x[k]!)), 0);
    const start = performance.now();
    solveRises(model, model.board.conditions[0]!, heat);
    nonlinear.push(performance.now() - start);
  }
  return {
    cellMm,
    unknowns: b.length,
    oursMs: median(ours),
    firstMs: ours[0]!,
    referenceMs: median(theirs),
    iterations,
    referenceIterations,
    residual,
    differenceK,
    nonlinearMs: median(nonlinear),
    kernelMB,
  };
}

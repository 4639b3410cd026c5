import { networkSolver } from '#core/numerics/kernel/network-solver.ts';
import { hardModel } from './hard-model.ts';

/** S3: most iterations to 1e-8 over seeded boards of 2, 4 and 8 layers on cells of a size. */
export function worstIterations(cellMm: number, boards: number): { worst: number; of: string } {
  let worst = 0;
  let of = '';
  for (let k = 0; k < boards; k++) {
    const layers = ([2, 4, 8] as const)[k % 3]!;
    const { model, b } = hardModel(3571 + 17 * k, layers, cellMm);
    const solver = networkSolver(model.network);
    solver.refresh();
    const { iterations, status } = solver.solve(b, new Float64Array(b.length), {
      tolerance: 1e-8,
      maximumIterations: 400,
    });
    solver.release();
    model.solver.release();
    if (status !== 'converged') return { worst: Infinity, of: model.board.title };
    if (iterations > worst) [worst, of] = [iterations, model.board.title];
  }
  return { worst, of };
}

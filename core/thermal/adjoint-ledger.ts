import { conjugateGradients, conjugateWork } from '#core/numerics/conjugate-gradients.ts';
import { multiply } from '#core/numerics/layered-network.ts';
import { applyMultigrid } from '#core/numerics/multigrid.ts';
import type { BoardModel } from './board-model.ts';
import { maximumIterations } from './method.ts';
import type { HeatInput } from './solution.ts';

/**
 * Heat ledger with the films of the finished solution: one adjoint solve per junction (A is symmetric, so the rise of a
 * junction per watt anywhere is the field of one watt in that junction). The entries of a victim sum to its rise.
 */
export function adjointLedger(model: BoardModel, heat: HeatInput) {
  const { network, multigrid } = model;
  const { diagonal } = multigrid.levels[0]!;
  const n = network.anchor.length;
  const work = conjugateWork(n);
  const unit = new Float64Array(n);
  const field = new Float64Array(n);
  const ledger: { victim: string; source: string; riseK: number }[] = [];
  for (const victim of model.packages) {
    unit[victim.junction] = 1;
    field.fill(0);
    conjugateGradients(
      {
        multiply: (x, y) => multiply(network, diagonal, x, y),
        precondition: (r, z) => applyMultigrid(multigrid, r, z),
      },
      unit,
      field,
      { tolerance: 1e-7, maximumIterations, work },
    );
    unit[victim.junction] = 0;
    for (const nodes of model.packages) {
      const power = heat.regulatorsW.get(nodes.ref);
      if (power) ledger.push({ victim: victim.ref, source: nodes.ref, riseK: power * field[nodes.junction]! });
    }
    for (const source of model.sources) {
      const power = heat.sourcesW.get(source.ref);
      if (!power) continue;
      const offset = source.side === 'top' ? 0 : model.layers.count - 1;
      let perWatt = 0;
      source.weights.cell.forEach(
        (cell, k) => (perWatt += source.weights.weight[k]! * field[cell * model.layers.count + offset]!),
      );
      ledger.push({ victim: victim.ref, source: source.ref, riseK: power * perWatt });
    }
  }
  return ledger;
}

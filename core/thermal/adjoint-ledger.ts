import type { BoardModel } from './board-model.ts';
import type { HeatInput } from './solution.ts';
import { solveLinear, type Rises } from './solve-rises.ts';

/** Rise of one junction by one source of heat, K, and the part of it that the air carried there. */
export type LedgerEntry = { victim: string; source: string; riseK: number; byAirK: number };

/** Rise of a junction per watt in every node, K/W: whole, and without what the air carries (null in still air). */
export type Influence = { whole: Float64Array; byBoard: Float64Array | null };

/** Relative residual asked of an adjoint solution: 1e-5 K in a hundred. */
const adjointTolerance = 1e-7;

/**
 * Heat ledger with the films of the finished solution: one adjoint solution per junction gives the rise of that junction per
 * watt anywhere, so that its cost does not grow with the number of sources. The entries of a victim sum to its rise, less
 * what sinks at a fixed temperature add.
 * @param start influences of an earlier solution of a like model
 */
export function adjointLedger(model: BoardModel, heat: HeatInput, solved: Rises, start?: readonly Influence[]) {
  const { films } = solved;
  const n = model.network.anchor.length;
  const unit = new Float64Array(n);
  const from = (field: Float64Array | null | undefined) => (field?.length === n ? field.slice() : new Float64Array(n));
  const ledger: LedgerEntry[] = [];
  const influences: Influence[] = [];
  model.packages.forEach((victim, index) => {
    unit[victim.junction] = 1;
    const byBoard = films.air ? from(start?.[index]?.byBoard) : null;
    if (byBoard) solveLinear(model, { ...films, air: null }, unit, byBoard, { tolerance: adjointTolerance });
    const whole = from(start?.[index]?.whole ?? byBoard);
    solveLinear(model, films, unit, whole, { tolerance: adjointTolerance, transposed: true });
    unit[victim.junction] = 0;
    influences.push({ whole, byBoard });
    const add = (source: string, power: number | undefined, meanOf: (field: Float64Array) => number) => {
      if (!power) return;
      const riseK = power * meanOf(whole);
      const byAirK = byBoard ? riseK - power * meanOf(byBoard) : 0;
      ledger.push({ victim: victim.ref, source, riseK, byAirK });
    };
    for (const nodes of model.packages)
      add(nodes.ref, heat.regulatorsW.get(nodes.ref), (field) => field[nodes.junction]!);
    for (const { ref, side, weights } of model.sources) {
      const offset = side === 'top' ? 0 : model.layers.count - 1;
      add(ref, heat.sourcesW.get(ref), (field) => {
        let mean = 0;
        weights.cell.forEach((cell, k) => (mean += weights.weight[k]! * field[cell * model.layers.count + offset]!));
        return mean;
      });
    }
  });
  return { ledger, influences };
}

import type { Condition } from '#core/board/condition.ts';
import type { BoardModel } from '#core/thermal/board-model.ts';
import { solveCondition } from '#core/thermal/solve-condition.ts';
import type { HeatInput, ThermalSolution } from '#core/thermal/solution.ts';

const rounds = 8;
const settledK = 0.01;

/**
 * Solves a condition; a shorted regulator that passes its shutdown temperature cycles there, so its power becomes the mean
 * that holds its junction at the threshold (secant steps on the power); none where the air and its neighbours alone pass it.
 * @returns the powers that were changed, and the regulators that cycle in the fault
 */
export function solveWithShutdown(
  model: BoardModel,
  condition: Condition,
  heat: HeatInput,
  options: { start: ThermalSolution | undefined; gridError: boolean },
): { solution: ThermalSolution; powers: Map<string, number>; cycling: Set<string> } {
  const powers = new Map<string, number>();
  const cycling = new Set<string>();
  const fault = condition.fault;
  const shorted = fault?.kind === 'output-short' ? fault.ref : null;
  const part = model.board.parts[model.board.regulators.find(({ ref }) => ref === shorted)?.part ?? ''];
  const shutdownC = part?.shutdownC ?? null;
  if (shorted === null || shutdownC === null) {
    return { solution: solveCondition(model, condition, heat, options), powers, cycling };
  }
  let solution = solveCondition(model, condition, heat, { start: options.start });
  let power = heat.regulatorsW.get(shorted) ?? 0;
  const ambientC = condition.ambientC + condition.boxRiseK;
  const junction = () => solution.regulators.get(shorted)?.junctionC ?? NaN;
  if (junction() > shutdownC) {
    cycling.add(shorted);
    for (let round = 0; round < rounds && Math.abs(junction() - shutdownC) > settledK; round++) {
      const own =
        solution.ledger.find((entry) => entry.victim === shorted && entry.source === shorted)?.riseK ??
        junction() - ambientC;
      power = Math.max(0, power + ((shutdownC - junction()) * power) / own);
      powers.set(shorted, power);
      const regulatorsW = new Map(heat.regulatorsW).set(shorted, power);
      solution = solveCondition(model, condition, { ...heat, regulatorsW }, { start: solution });
      if (solution.status !== 'converged' || power === 0) break;
    }
  }
  if (options.gridError && solution.status === 'converged') {
    const regulatorsW = new Map(heat.regulatorsW).set(shorted, power);
    solution = solveCondition(model, condition, { ...heat, regulatorsW }, { start: solution, gridError: true });
  }
  return { solution, powers, cycling };
}

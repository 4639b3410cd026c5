import { modelErrorShare } from '#core/accuracy/model-error.ts';
import type { Condition } from '#core/board/condition.ts';
import type { CheckedCondition } from '#core/derating/finding-context.ts';
import { verdictOf, worstVerdict } from '#core/derating/verdict.ts';
import type { OperatingPoint } from '#core/electrical/operating-point.ts';
import { operatingPoints } from '#core/electrical/operating-points.ts';
import { sourcePowers } from '#core/electrical/source-powers.ts';
import type { ConditionResult, SourceResult } from '#core/result/result.ts';
import type { BoardModel } from '#core/thermal/board-model.ts';
import type { ThermalSolution } from '#core/thermal/solution.ts';
import { heatInput } from './heat-input.ts';
import { regulatorResult } from './regulator-result.ts';
import { solveWithShutdown } from './solve-with-shutdown.ts';

type Options = {
  start: ThermalSolution | undefined;
  gridError: boolean;
  now: (() => number) | undefined;
};

/** One condition of a board: volts and amperes, then heat, then limits. */
export function checkCondition(
  model: BoardModel,
  condition: Condition,
  options: Options,
): { checked: CheckedCondition; solution: ThermalSolution } {
  const began = options.now?.() ?? 0;
  const { board } = model;
  const points = operatingPoints(board, condition);
  const powersW = sourcePowers(board, condition, points);
  const { solution, powers, cycling } = solveWithShutdown(model, condition, heatInput(points, powersW), options);
  const usable = solution.status === 'converged';
  const complete =
    usable &&
    [...powersW.values()].every((power) => power !== null) &&
    [...points.values()].every((point) => point.missing.length === 0);
  const regulators = board.regulators.map((regulator) => {
    const point = points.get(regulator.ref)!;
    const power = powers.get(regulator.ref) ?? point.dissipationW;
    return regulatorResult({
      board,
      condition,
      regulator,
      point: { ...point, dissipationW: power } satisfies OperatingPoint,
      heat: usable ? (solution.regulators.get(regulator.ref) ?? null) : null,
      cycling: cycling.has(regulator.ref),
      complete,
    });
  });
  const sources = sourceResults(model, condition, solution, powersW, complete);
  const judged = [
    ...regulators.map((regulator) => regulator.verdict),
    ...sources.filter((source) => source.limitC !== null).map((source) => source.verdict),
  ];
  const result: ConditionResult = {
    name: condition.name,
    status: solution.status,
    message: solution.message,
    regulators,
    sources,
    probes: [...solution.probes].map(([id, value]) => ({
      id,
      temperatureC: usable && Number.isFinite(value) ? value : null,
    })),
    ledger: usable ? solution.ledger : [],
    board: usable ? solution.board : null,
    energy: usable ? solution.energy : null,
    solver: usable ? { ...solution.solver, milliseconds: options.now ? Math.round(options.now() - began) : 0 } : null,
    verdict: board.regulators.length === 0 || !usable ? 'not evaluated' : worstVerdict(judged),
  };
  return { checked: { condition, points, result, notices: solution.notices }, solution };
}

function sourceResults(
  model: BoardModel,
  condition: Condition,
  solution: ThermalSolution,
  powersW: ReadonlyMap<string, number | null>,
  complete: boolean,
): SourceResult[] {
  return model.board.sources.map((source) => {
    const found = solution.status === 'converged' ? solution.sources.get(source.ref) : undefined;
    const temperatureC = found && Number.isFinite(found.meanC) ? found.meanC : null;
    const rise = temperatureC === null ? 0 : temperatureC - condition.ambientC - condition.boxRiseK;
    const verdict =
      source.limitC === null
        ? 'not evaluated'
        : verdictOf(temperatureC, source.limitC, Math.abs(rise) * modelErrorShare(condition, null));
    return {
      ref: source.ref,
      powerW: powersW.get(source.ref) ?? null,
      temperatureC,
      maxC: found && Number.isFinite(found.maxC) ? found.maxC : null,
      limitC: source.limitC,
      verdict: complete || verdict === 'over' ? verdict : 'not evaluated',
    };
  });
}

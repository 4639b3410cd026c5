import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import type { Regulator } from '#core/board/placement.ts';
import { limitsOf } from '#core/derating/limits.ts';
import { worstVerdict } from '#core/derating/verdict.ts';
import type { OperatingPoint } from '#core/electrical/operating-point.ts';
import type { RegulatorResult } from '#core/result/result.ts';
import type { RegulatorHeat } from '#core/thermal/solution.ts';

type Input = {
  board: Board;
  condition: Condition;
  regulator: Regulator;
  point: OperatingPoint;
  /** null where there is no converged solution. */
  heat: RegulatorHeat | null;
  cycling: boolean;
  /** Whether every source of heat on the board is known; a hidden neighbour must not give a pass. */
  complete: boolean;
};

/** One regulator's line of the result: temperatures, ladder, limits and verdict. */
export function regulatorResult({
  board,
  condition,
  regulator,
  point,
  heat: solved,
  cycling,
  complete,
}: Input): RegulatorResult {
  const part = board.parts[regulator.part]!;
  // Without its own dissipation a junction temperature would be that of a part switched off.
  const heat = point.dissipationW === null ? null : solved;
  const uncertaintyK = heat ? Math.hypot(heat.gridErrorK ?? 0, heat.modelErrorK) : null;
  const junctionC = heat && Number.isFinite(heat.junctionC) ? heat.junctionC : null;
  const faulted = condition.fault?.kind === 'output-short' && condition.fault.ref === regulator.ref;
  const limits = limitsOf(
    board,
    part,
    { junctionC, uncertaintyK, inputV: point.inputV, outputA: point.outputA },
    faulted,
  ).map((limit) => {
    // A rule for a quantity that a known dissipation leaves open says nothing; it must not turn into a pass or a fail.
    const verdict = complete || limit.verdict === 'over' ? limit.verdict : ('not evaluated' as const);
    return { ...limit, verdict };
  });
  const judged = limits.filter(
    (limit) => !(regulator.powerW !== null && limit.actual === null && limit.quantity !== 'junctionC'),
  );
  const hasRule = faulted || board.criteria.rules.some((rule) => rule.quantity === 'junctionC');
  const worst = worstVerdict(judged.map((limit) => limit.verdict));
  const localC = condition.ambientC + condition.boxRiseK;
  return {
    ref: regulator.ref,
    dissipationW: point.dissipationW,
    junctionC,
    uncertaintyK,
    gridErrorK: heat?.gridErrorK ?? null,
    modelErrorK: heat?.modelErrorK ?? null,
    caseTopC: heat?.caseTopC ?? null,
    landC: heat?.landC ?? null,
    thetaJaKPerW: junctionC === null || !point.dissipationW ? null : (junctionC - localC) / point.dissipationW,
    inputV: point.inputV,
    outputV: point.outputV,
    outputA: point.outputA,
    groundA: point.groundA,
    headroomV: point.headroomV,
    regulating: point.regulating,
    shutsDown: cycling || (junctionC !== null && part.shutdownC !== null && junctionC >= part.shutdownC),
    ladderK: heat
      ? {
          box: heat.boxK,
          air: heat.preheatedAirK,
          neighbours: heat.neighboursK,
          board: heat.boardK,
          package: heat.packageK,
        }
      : null,
    limits,
    verdict: hasRule || worst === 'over' ? worst : 'not evaluated',
  };
}

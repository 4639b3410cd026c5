import type { Board } from '#core/board/document.ts';
import type { FindingContext } from '#core/derating/finding-context.ts';
import { operatingPoints } from '#core/electrical/operating-points.ts';
import { sourcePowers } from '#core/electrical/source-powers.ts';
import type { ConditionResult, RegulatorResult } from '#core/result/result.ts';
import type { ThermalNotice } from '#core/thermal/solution.ts';

type Solved = {
  regulators?: (Partial<RegulatorResult> & { ref: string })[];
  sources?: (Partial<ConditionResult['sources'][number]> & { ref: string })[];
  maxC?: number;
  notices?: ThermalNotice[];
};

/** What findings and cautions are made from: true operating points, and temperatures as given instead of solved. */
export function contextOf(board: Board, solved: Solved = {}): FindingContext {
  return {
    board,
    conditions: board.conditions.map((condition) => {
      const points = operatingPoints(board, condition);
      const powers = sourcePowers(board, condition, points);
      return {
        condition,
        points,
        notices: solved.notices ?? [],
        result: {
          name: condition.name,
          status: 'converged',
          message: null,
          regulators: (solved.regulators ?? []).map((given) => ({ ...blank, ...given })),
          sources: board.sources.map(({ ref, limitC }) => ({
            ref,
            powerW: powers.get(ref) ?? null,
            temperatureC: null,
            maxC: null,
            limitC,
            verdict: 'not evaluated',
            ...solved.sources?.find((given) => given.ref === ref),
          })),
          probes: [],
          ledger: [],
          board: solved.maxC === undefined ? null : { maxC: solved.maxC, maxAt: [1, 2], meanC: solved.maxC },
          energy: null,
          solver: null,
          verdict: 'within',
        },
      };
    }),
  };
}

const blank: Omit<RegulatorResult, 'ref'> = {
  dissipationW: null,
  junctionC: null,
  uncertaintyK: null,
  gridErrorK: null,
  modelErrorK: null,
  caseTopC: null,
  landC: null,
  thetaJaKPerW: null,
  inputV: null,
  outputV: null,
  outputA: null,
  groundA: null,
  headroomV: null,
  regulating: null,
  shutsDown: false,
  ladderK: null,
  limits: [],
  verdict: 'not evaluated',
};

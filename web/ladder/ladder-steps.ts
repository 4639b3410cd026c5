import type { Ladder, RegulatorResult } from '#core/result/result.ts';

export type LadderPart = keyof Ladder;

/** Parts of a rise from the ambient up. */
export const rungs: readonly { part: LadderPart; word: string }[] = [
  { part: 'box', word: 'Box' },
  { part: 'air', word: 'Preheated air' },
  { part: 'neighbours', word: 'Neighbours' },
  { part: 'board', word: 'Board' },
  { part: 'package', word: 'Package' },
];

export type LadderStep = { part: LadderPart; fromK: number; toK: number };

/** Each part as a step on the one before, and the derated junction limit, all in kelvins over the ambient. */
export function ladderSteps({ ladderK, junctionC, limits }: RegulatorResult): {
  steps: LadderStep[];
  limitK: number | null;
} {
  if (!ladderK || junctionC === null) return { steps: [], limitK: null };
  let height = 0;
  const steps = rungs.map(({ part }) => {
    const fromK = height;
    height += ladderK[part];
    return { part, fromK, toK: height };
  });
  const limitC = limits.find(({ quantity }) => quantity === 'junctionC')?.limit ?? null;
  // The parts sum to junction − ambient, so the ambient need not be known here.
  return { steps, limitK: limitC === null ? null : limitC - (junctionC - height) };
}

/** Height that every ladder of a row fits in, K. */
export function ladderReach(regulators: readonly RegulatorResult[]): number {
  const heights = regulators.flatMap((regulator) => {
    const { steps, limitK } = ladderSteps(regulator);
    return [...steps.map(({ toK }) => toK), limitK ?? 0];
  });
  return Math.max(10, ...heights);
}

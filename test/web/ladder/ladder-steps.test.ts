import { expect, test } from 'vitest';
import type { RegulatorResult } from '#core/result/result.ts';
import { ladderReach, ladderSteps } from '#web/ladder/ladder-steps.ts';

/** Ambient 43 °C, so the junction stands at 43 + 12 + 1 + 18 + 41 + 6 = 121 °C. */
const regulator: RegulatorResult = {
  ref: 'U1',
  dissipationW: 1.29,
  junctionC: 121,
  uncertaintyK: 6,
  gridErrorK: 1,
  modelErrorK: 5,
  caseTopC: 112,
  landC: 110,
  thetaJaKPerW: 51,
  inputV: 14.35,
  outputV: 5,
  outputA: 0.13,
  groundA: 0.004,
  headroomV: 4,
  regulating: true,
  shutsDown: false,
  ladderK: { box: 12, air: 1, neighbours: 18, board: 41, package: 6 },
  limits: [
    { quantity: 'junctionC', actual: 121, limit: 110, margin: -11, ratio: null, verdict: 'over', source: 'House' },
  ],
  verdict: 'over',
};

test('ladder – five parts – each stands on the one before, the limit at 110 − 43 = 67 K over the ambient', () => {
  const { steps, limitK } = ladderSteps(regulator);
  expect(steps.map(({ part, fromK, toK }) => [part, fromK, toK])).toEqual([
    ['box', 0, 12],
    ['air', 12, 13],
    ['neighbours', 13, 31],
    ['board', 31, 72],
    ['package', 72, 78],
  ]);
  expect(limitK).toBeCloseTo(67, 10);
  expect(ladderReach([regulator])).toBe(78);
});

test('ladder – of a regulator that was not evaluated – no steps and no limit', () => {
  expect(ladderSteps({ ...regulator, junctionC: null, ladderK: null })).toEqual({ steps: [], limitK: null });
});

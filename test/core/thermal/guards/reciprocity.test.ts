import { expect, test } from 'vitest';
import type { Condition } from '#core/board/condition.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { hardBoard } from './hard-board.ts';
import { solved, tightJunctions } from './solved-board.ts';

const three = () => {
  const board = hardBoard({ filmWPerM2K: 11, sinks: [] });
  const [first] = board.regulators;
  return {
    ...board,
    regulators: [
      ...board.regulators,
      { ...first!, ref: 'U3', at: [16, 15] as [number, number], side: 'bottom' as const },
    ],
  };
};

test('three parts on both sides – the rise of each by a watt in the other – is the same both ways to 1e-6 of the largest', () => {
  const model = buildBoardModel(three(), { cellMm: 0.5 });
  const refs = ['U1', 'U2', 'U3'];
  const rises = refs.map((ref) => tightJunctions(model, { [ref]: 1 }));
  const most = Math.max(...rises.flatMap((rise) => [...rise.values()]));
  for (let i = 0; i < refs.length; i++) {
    for (let j = 0; j < i; j++) {
      expect(Math.abs(rises[i]!.get(refs[j]!)! - rises[j]!.get(refs[i]!)!) / most).toBeLessThan(1e-6);
    }
  }
  expect(Math.min(...rises.flatMap((rise) => [...rise.values()]))).toBeGreaterThan(1);
});

test.each<[string, Partial<Condition>]>([
  ['still air', { filmWPerM2K: null }],
  ['a fixed film', { filmWPerM2K: 9 }],
])('%s – the ledger, made of adjoint solutions – is symmetric per watt and sums to each rise', (_, change) => {
  const powers: Record<string, number> = { U1: 0.7, U2: 0.4, U3: 0.2, Q1: 0.3 };
  const solution = solved(three(), powers, change, 0.5);
  const perWatt = (victim: string, source: string) =>
    solution.ledger.find((entry) => entry.victim === victim && entry.source === source)!.riseK / powers[source]!;
  const most = perWatt('U1', 'U1');
  for (const [one, other] of [
    ['U1', 'U2'],
    ['U1', 'U3'],
    ['U2', 'U3'],
  ] as const) {
    expect(Math.abs(perWatt(one, other) - perWatt(other, one)) / most).toBeLessThan(1e-6);
  }
  for (const [ref, { junctionC }] of solution.regulators) {
    const sum = solution.ledger.filter(({ victim }) => victim === ref).reduce((total, { riseK }) => total + riseK, 0);
    expect(sum).toBeCloseTo(junctionC - 25, 4);
  }
});

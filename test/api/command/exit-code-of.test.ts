import { describe, expect, test } from 'vitest';
import { checkBoard } from '#core/check/check-board.ts';
import { soundBoard } from '#test/core/derating/sound-board.ts';
import { exitCodeOf } from '#api/command/exit-code-of.ts';

const bare = soundBoard((board) => {
  board.regulators = [];
  board.conditions.forEach((condition) => (condition.loadsA = {}));
});
const solved = checkBoard(bare, [], { cellMm: 2 }).result;
const [hot, cold] = solved.conditions;

describe('exitCodeOf – a board without regulators – fine when its heat is solved and no source is over', () => {
  const withSource = (limitC: number | null, verdict: 'within' | 'over' | 'not evaluated') => ({
    ...solved,
    conditions: [{ ...hot!, sources: [{ ...hot!.sources[0]!, limitC, verdict }] }, cold!],
  });
  test.each([
    [null, 'not evaluated', 0],
    [100, 'within', 0],
    [100, 'over', 1],
    [100, 'not evaluated', 1],
  ] as const)('source limit %s, %s – %d', (limitC, verdict, code) => {
    expect(exitCodeOf(bare, withSource(limitC, verdict))).toBe(code);
  });

  test('no condition at all – nothing was solved – 1', () => {
    expect(exitCodeOf(bare, { ...solved, conditions: [] })).toBe(1);
  });
});

test.each(['not-converged', 'invalid'] as const)(
  'exitCodeOf – one condition of two %s – 3, whatever the rest says',
  (status) => {
    const result = { ...solved, verdict: 'over' as const, conditions: [hot!, { ...cold!, status }] };
    expect(exitCodeOf(soundBoard(), result)).toBe(3);
  },
);

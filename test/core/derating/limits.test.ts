import { describe, expect, test } from 'vitest';
import type { Rule } from '#core/board/criteria.ts';
import { limitsOf } from '#core/derating/limits.ts';
import { smallBoard } from '../board/small-board.ts';

const part = { ...smallBoard.parts.five!, junctionMaxC: 150, inputMaxV: 35, outputMaxA: 0.5 };
const stress = { junctionC: 104, uncertaintyK: 6, inputV: 28, outputA: 0.41 };
const withRules = (...rules: Rule[]) => ({ ...smallBoard, criteria: { name: 'House', rules } });
const limits = (rules: Rule[], given = stress, model = part) => limitsOf(withRules(...rules), model, given, false);

describe('limitsOf – junction rules – the lowest of what the rule states', () => {
  // The table "what each rule gives" of the criteria study: 125 / 150 / 175 °C parts.
  test.each<[string, Omit<Rule, 'quantity'>, [number, number, number]]>([
    ['40 K below, at most 110 °C', { belowMaxK: 40, atMostC: 110 }, [85, 110, 110]],
    ['25 K below', { belowMaxK: 25 }, [100, 125, 150]],
    ['80 %', { ratio: 0.8 }, [100, 120, 140]],
    ['at most 100 °C', { atMostC: 100 }, [100, 100, 100]],
  ])('%s', (_, rule, expected) => {
    const found = [125, 150, 175].map(
      (junctionMaxC) => limits([{ quantity: 'junctionC', ...rule }], stress, { ...part, junctionMaxC })[0]!.limit,
    );
    expect(found).toEqual(expected);
  });

  test('a limit above the part’s own maximum – the maker’s maximum counts', () => {
    const found = limits([{ quantity: 'junctionC', atMostC: 105 }], stress, { ...part, junctionMaxC: 100 });
    expect(found.map(({ limit }) => limit)).toEqual([100, 100]);
  });
});

test('limitsOf – volts and amperes – ratio of the maker’s maximum, with the stress ratio', () => {
  const [input, output] = limits([
    { quantity: 'inputV', ratio: 0.8 },
    { quantity: 'outputA', ratio: 0.8 },
  ]);
  // 0.8 · 35 V = 28 V, met exactly; 0.8 · 0.5 A = 0.4 A, passed by 10 mA.
  expect(input).toMatchObject({ quantity: 'inputV', limit: 28, margin: 0, ratio: 0.8, verdict: 'within' });
  expect(output).toMatchObject({ quantity: 'outputA', limit: 0.4, verdict: 'over' });
  expect(output!.margin).toBeCloseTo(-0.01, 12);
  expect(output!.ratio).toBeCloseTo(0.82, 12);
});

test('limitsOf – no rule at all – the maker’s maximum alone, with its source', () => {
  expect(limits([])).toEqual([
    {
      quantity: 'junctionC',
      actual: 104,
      limit: 150,
      margin: 46,
      ratio: null,
      verdict: 'within',
      source: "Maker's maximum, FIVE: made up for tests",
    },
  ]);
});

test('limitsOf – a junction that is not known – not evaluated, without a margin', () => {
  const found = limits([{ quantity: 'junctionC', atMostC: 110 }], { ...stress, junctionC: null as never });
  expect(found.map(({ verdict, margin }) => [verdict, margin])).toEqual([
    ['not evaluated', null],
    ['not evaluated', null],
  ]);
});

test('limitsOf – the regulator that is shorted itself – its maker’s maximum, not the derating', () => {
  const board = withRules({ quantity: 'junctionC', atMostC: 110 }, { quantity: 'outputA', ratio: 0.8 });
  expect(limitsOf(board, part, stress, true).map(({ limit }) => limit)).toEqual([150]);
});

test('limitsOf – a rule quoted by another text – says so in its source', () => {
  const rule: Rule = {
    quantity: 'junctionC',
    atMostC: 100,
    document: 'MIL-STD-975H',
    clause: 'App. A 3.7',
    mark: 'second-hand',
  };
  expect(limits([rule])[0]!.source).toBe('House: MIL-STD-975H, App. A 3.7 (second hand)');
});

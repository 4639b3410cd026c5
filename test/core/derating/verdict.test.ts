import { describe, expect, test } from 'vitest';
import { verdictOf, worstVerdict } from '#core/derating/verdict.ts';

/** The next double above and below a number of this size. */
const ulp = (value: number) => value * Number.EPSILON;

describe('verdictOf – at the very border – unrounded, and equal is inside', () => {
  // 110 °C with a band of 6 K; the spacing of doubles near 110 is 2^−46, below 110·ε.
  test.each([
    [110 - ulp(110), 'close'],
    [110, 'close'],
    [110 + ulp(110), 'over'],
    [104 + ulp(104), 'close'],
    [104, 'close'],
    [104 - ulp(104), 'within'],
  ] as const)('%d against 110 ± 6 – %s', (actual, verdict) => expect(verdictOf(actual, 110, 6)).toBe(verdict));

  test('an exact quantity – within up to its limit, over beyond', () => {
    expect(verdictOf(28, 28, 0)).toBe('within');
    expect(verdictOf(28 + ulp(28), 28, 0)).toBe('over');
  });
});

test.each([null, NaN, Infinity, -Infinity])('verdictOf – %j – not evaluated', (actual) => {
  expect(verdictOf(actual, 110, 1)).toBe('not evaluated');
});

test('verdictOf – an uncertainty that is not known – no plain pass', () => {
  expect(verdictOf(20, 110, NaN)).toBe('close');
});

test('worstVerdict – over beats a missing one, a missing one beats a pass, of nothing nothing is evaluated', () => {
  expect(worstVerdict(['within', 'over', 'not evaluated'])).toBe('over');
  expect(worstVerdict(['within', 'not evaluated', 'close'])).toBe('not evaluated');
  expect(worstVerdict(['within', 'close'])).toBe('close');
  expect(worstVerdict([])).toBe('not evaluated');
});

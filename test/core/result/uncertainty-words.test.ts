import { expect, test } from 'vitest';
import { uncertaintyWords } from '#core/result/uncertainty-words.ts';

// Shares of the variance: 10² ÷ (10² + 1²) = 99 %, 2² ÷ (2² + 1.5²) = 64 %, 2² ÷ (2² + 1.9²) = 53 %.
test.each([
  [1, 10, 'nearly all model error'],
  [2, 1.5, 'mostly grid error'],
  [2, 1.9, 'grid and model error alike'],
  [null, 3, 'model error alone, the grid error was not evaluated'],
  [1, null, null],
] as const)('grid %s K and model %s K – in words – %s', (gridErrorK, modelErrorK, words) => {
  expect(uncertaintyWords({ gridErrorK, modelErrorK })).toBe(words);
});

import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { errorStatistics, errorOf, movingCases, stillCases } from '#core/accuracy/error-statistics.ts';
import { modelErrorShare, stillShares } from '#core/accuracy/model-error.ts';
import { publishedAccuracy } from '#core/accuracy/published-accuracy.ts';
import { boardIds, boardOf, predict, published } from '#test/accuracy/published-board.ts';

/*
 * Published test boards, all by one convention (sources in test/published/published.json). The bounds are what the product
 * promises: mean absolute error 11 %, root mean square 14 %, nine of ten cases inside twice the stated uncertainty.
 */
test('every board document – the list of published values – has one, but for the exact sheets', () => {
  expect(published.map(({ id }) => id).sort()).toEqual(boardIds.filter((id) => !id.startsWith('DA')).sort());
});

test.each(published.map((one) => [one.id, one] as const))(
  '%s – the table of the product – is what the method gives',
  (id, one) => {
    const kept = publishedAccuracy.find((candidate) => candidate.id === id)!;
    const now = predict(one);
    expect({ ...kept, predictedKPerW: 0 }).toEqual({ ...now, predictedKPerW: 0 });
    expect(Math.abs(kept.predictedKPerW / now.predictedKPerW - 1)).toBeLessThan(0.001);
  },
);

test('still air, sources that do not contradict themselves – errors – within the promise', () => {
  const { cases, meanAbsolute, rms } = errorStatistics(stillCases(publishedAccuracy));
  expect(cases).toBeGreaterThanOrEqual(50);
  expect(meanAbsolute).toBeLessThanOrEqual(0.11);
  expect(rms).toBeLessThanOrEqual(0.14);
});

test('stated uncertainty – doubled – holds nine of ten published cases', () => {
  const counted = [...stillCases(publishedAccuracy), ...movingCases(publishedAccuracy)];
  const inside = counted.filter((one) => {
    const share = modelErrorShare(boardOf(one.id).conditions[0]!, one.path);
    return Math.abs(errorOf(one)) * one.publishedKPerW <= 2 * share * one.predictedKPerW;
  });
  expect(inside.length / counted.length).toBeGreaterThanOrEqual(0.9);
});

test('a heat path of few cases – its share – is drawn towards that of all, which is the worse known one', () => {
  const leads = stillCases(publishedAccuracy).filter(({ path }) => path === 'leads');
  const misses = leads.map((one) => (one.publishedKPerW / one.predictedKPerW - 1) ** 2);
  const own = Math.sqrt(misses.reduce((sum, miss) => sum + miss, 0) / misses.length);
  expect(stillShares.leads).toBeGreaterThan(Math.min(own, stillShares.all));
  expect(stillShares.leads).toBeLessThan(Math.max(own, stillShares.all));
});

test('the table of the README – its figures – are those of the data', () => {
  const readme = readFileSync(new URL('../../../README.md', import.meta.url), 'utf8');
  const figures = (share: number) => `${share < 0 ? '−' : ''}${Math.abs(100 * share).toFixed(0)} %`;
  const still = stillCases(publishedAccuracy);
  for (const family of new Set(still.map((one) => one.family))) {
    const of = errorStatistics(still.filter((one) => one.family === family));
    const row = [family, of.cases, figures(of.mean), figures(of.meanAbsolute), figures(of.rms)].join(' | ');
    expect(readme.replace(/ +/g, ' ')).toContain(`| ${row} |`);
  }
});

import { expect, test } from 'vitest';
import { heatPathOf } from '#core/accuracy/heat-path.ts';
import { typicalPackages } from '#core/catalog/typical-packages.ts';

// Outlines as the trade builds them (common practice): tabs beside the body, pads under it, leads alone.
test.each([
  ['SOT-223', 'tab'],
  ['TO-252', 'tab'],
  ['TO-263', 'tab'],
  ['SOT-23-5', 'leads'],
  ['SO-8', 'leads'],
] as const)('%s – heat path – %s', (name, path) => {
  expect(heatPathOf(typicalPackages[name]!)).toBe(path);
});

test('every package of the catalog with an exposed pad – heat path – pad', () => {
  const padded = Object.entries(typicalPackages).filter(([name]) => /pad|QFN|DFN/i.test(name));
  expect(padded.length).toBeGreaterThan(1);
  for (const [, model] of padded) expect(heatPathOf(model)).toBe('pad');
});

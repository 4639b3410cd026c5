import { readFile } from 'node:fs/promises';
import { describe, expect, test } from 'vitest';
import { z } from 'zod';
import { crossCheck } from '#core/board/cross-check.ts';
import { criteria } from '#core/board/criteria.ts';
import { packageModel } from '#core/board/package.ts';
import { part } from '#core/board/part.ts';
import { dielectricLayer } from '#core/board/stackup.ts';
import { criteriaSets } from '#core/catalog/criteria-sets.ts';
import { laminates } from '#core/catalog/laminates.ts';
import { typicalPackages } from '#core/catalog/typical-packages.ts';
import { smallBoard } from '../board/small-board.ts';

describe('catalogue – every entry – valid, and with a source', () => {
  test.each(Object.entries(typicalPackages))('package %s', (_, model) => {
    expect(packageModel.parse(model)).toEqual(model);
  });
  test.each(criteriaSets.map((set) => [set.name, set] as const))('criteria %s', (_, set) => {
    expect(criteria.parse(set)).toEqual(set);
    for (const rule of set.rules) expect(rule.document ?? rule.source, 'a rule says where it comes from').toBeTruthy();
    for (const rule of set.rules)
      expect(rule.mark, 'nothing from memory is offered as a cited limit').not.toBe('unverified');
  });
  test.each(laminates.map((laminate) => [laminate.name, laminate] as const))('laminate %s', (_, { layer, source }) => {
    expect(() => dielectricLayer.parse({ thicknessMm: 1, ...layer })).not.toThrow();
    expect(source).not.toBe('');
  });
});

test('packages – pads of one outline – never lie on each other', () => {
  for (const [name, { lands }] of Object.entries(typicalPackages)) {
    const pads = lands.flatMap((land) => land.pads.map((pad) => ({ ...pad, land: land.name })));
    pads.forEach((a, i) =>
      pads.slice(i + 1).forEach((b) => {
        const apart = [0, 1].some((k) => Math.abs(a.at[k]! - b.at[k]!) >= (a.sizeMm[k]! + b.sizeMm[k]!) / 2 - 1e-9);
        // The two pads of a SOT-89 tab are one piece of metal.
        expect(apart || a.land === b.land, `${name}: ${a.land} and ${b.land}`).toBe(true);
      }),
    );
  }
});

test('demo parts library – every part on an outline of the catalogue – no fault', async () => {
  const text = await readFile(new URL('../../../db/seeds/demo/parts.json', import.meta.url), 'utf8');
  const parts = z.record(z.string(), part).parse(JSON.parse(text));
  expect(Object.keys(parts).length).toBeGreaterThanOrEqual(8);
  expect(
    crossCheck({ ...smallBoard, regulators: [], conditions: [], parts, packages: { ...typicalPackages } }),
  ).toEqual([]);
});

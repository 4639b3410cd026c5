import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { plantedFaults } from './planted-faults.ts';

const root = join(import.meta.dirname, '../..');

test.each(plantedFaults.map((one) => [one.fault, one] as const))(
  'planted fault “%s” – its text – stands exactly once in its file, and its tests exist',
  (_, { file, from, to, tests }) => {
    expect(readFileSync(join(root, file), 'utf8').split(from)).toHaveLength(2);
    expect(to).not.toBe(from);
    for (const path of tests) expect(existsSync(join(root, path)), path).toBe(true);
  },
);

test('planted faults – names – tell them apart', () => {
  expect(new Set(plantedFaults.map(({ fault }) => fault)).size).toBe(plantedFaults.length);
});

import { expect, test } from 'vitest';
import type { AssemblyView } from '#core/contract/assemblies.ts';
import { matchingAssemblies } from '#web/assemblies/matching-assemblies.ts';

const assembly = (number: string, title: string, state: 'sketch' | 'issued'): AssemblyView => ({
  id: number,
  number,
  title,
  createdAt: '2026-11-12T09:00:00Z',
  revisions: [{ id: number, letter: 'A', state, verdict: null, changedAt: '2026-11-12T09:00:00Z' }],
});
const all = [assembly('PCA-0617', 'Sensor gateway', 'sketch'), assembly('PCA-0590', 'Valve driver', 'issued')];

test('search – words in any order and letter case – assemblies that hold them all', () => {
  expect(matchingAssemblies(all, 'ISSUED valve').map(({ number }) => number)).toEqual(['PCA-0590']);
  expect(matchingAssemblies(all, '  ')).toHaveLength(2);
  expect(matchingAssemblies(all, 'valve sketch')).toHaveLength(0);
});

import { expect, test } from 'vitest';
import { type UpgradeStep, upgrade } from '#core/board/upgrade.ts';

const written = { format: 'dropwatt-board', version: 1, title: 'old' };

/** Two steps that a later release might have: a field renamed, then one added. */
const steps = new Map<number, UpgradeStep>([
  [1, ({ title, ...rest }) => ({ ...rest, heading: title })],
  [2, (document) => ({ ...document, language: 'en' })],
]);

test('upgrade – the present version – the very same document', () => {
  const upgraded = upgrade(written);
  expect('document' in upgraded && upgraded.document).toBe(written);
});

test('upgrade – two versions behind – one step after the other, the old document untouched', () => {
  expect(upgrade(written, steps, 3)).toEqual({
    document: { format: 'dropwatt-board', version: 3, heading: 'old', language: 'en' },
  });
  expect(written).toEqual({ format: 'dropwatt-board', version: 1, title: 'old' });
});

test('upgrade – a step is missing – refused by its version', () => {
  expect(upgrade(written, new Map([[2, (document) => document]]), 3)).toEqual({
    fault: { path: 'version', message: '1 can no longer be upgraded' },
  });
});

test.each([0, 1.5, '1', null, undefined])('upgrade – version %j – refused', (version) => {
  expect(upgrade({ ...written, version })).toMatchObject({ fault: { path: 'version' } });
});

import { expect, test } from 'vitest';
import { eventWords, factLines } from '#web/audit/event-words.ts';

test('kind of event – dots and dashes – words', () => {
  expect(eventWords('revision.sent-back')).toBe('Revision sent back');
});

test('facts – from and to – one line with the old and the new value', () => {
  const facts = { state: { from: 'sketch', to: 'in review' }, roles: { from: ['hardware-lead'], to: [] } };
  expect(factLines(facts)).toEqual([
    { name: 'state', before: 'sketch', value: 'in review' },
    { name: 'roles', before: 'hardware lead', value: '–' },
  ]);
});

test('facts – hash, place and list – short and in words', () => {
  const sketchHash = `sha256:${'0123456789abcdef'.repeat(4)}`;
  const place = { kind: 'regulator', id: 'U1' };
  const reasons = [{ rule: 'tab-net-mismatch', ref: null, reason: 'Isolated' }];
  expect(factLines({ sketchHash, place, reasons }).map(({ name, value }) => `${name}: ${value}`)).toEqual([
    'sketch hash: sha256:0123456789ab…',
    'place: kind regulator, id U1',
    'reasons: rule tab-net-mismatch, reason Isolated',
  ]);
});

import { expect, test } from 'vitest';
import { eventWords, factLines } from '#web/audit/event-words.ts';

test('kind of event – dots and dashes – words', () => {
  expect(eventWords('revision.sent-back')).toBe('Revision sent back');
});

test('facts – a pair of values – one line with both', () => {
  expect(factLines({ state: { old: 'sketch', new: 'in review' }, sketchVersion: 7 })).toEqual([
    { name: 'state', before: 'sketch', value: 'in review' },
    { name: 'sketch version', value: '7' },
  ]);
  expect(factLines({ from: 'cleared', to: 'issued' })).toEqual([
    { name: 'change', before: 'cleared', value: 'issued' },
  ]);
});

test('facts – old and new fields beside each other – only what changed', () => {
  const facts = { old: { name: 'Yuki', roles: ['hardware-lead'] }, new: { name: 'Yuki', roles: [] } };
  expect(factLines(facts)).toEqual([{ name: 'roles', before: 'hardware-lead', value: '–' }]);
});

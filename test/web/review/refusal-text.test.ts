import { expect, test } from 'vitest';
import { refusalText } from '#web/review/refusal-text.ts';

test('in review – for one who drew on it – says that somebody else clears it', () => {
  expect(refusalText({ state: 'in review', allowed: ['send-back', 'comment'] })).toMatch(/author never clears/);
});
test('in review – for one who may clear it – says nothing', () => {
  expect(refusalText({ state: 'in review', allowed: ['clear', 'send-back'] })).toBeNull();
});
test.each(['issued', 'superseded', 'withdrawn'] as const)(
  '%s – for everybody – says that it stays as it is',
  (state) => {
    expect(refusalText({ state, allowed: [] })).toMatch(/frozen|stays readable/);
  },
);

import { expect, test } from 'vitest';
import { sentBackNotice } from '#api/mail/notices/sent-back-notice.ts';
import { submittedNotice } from '#api/mail/notices/submitted-notice.ts';
import type { CheckResult, RegulatorResult } from '#core/result/result.ts';

const regulator = (ref: string, junctionC: number, verdict: RegulatorResult['verdict'], margin: number) =>
  ({
    ref,
    junctionC,
    verdict,
    limits: [
      { quantity: 'junctionC', actual: junctionC, limit: junctionC + margin, margin, ratio: null, verdict, source: '' },
    ],
  }) as unknown as RegulatorResult;

const result = {
  conditions: [
    { name: 'Room', regulators: [regulator('U1', 61, 'within', 49), regulator('U2', 58.04, 'within', 52)] },
    { name: 'Hot, high line', regulators: [regulator('U1', 121.04, 'over', -11.04), regulator('U2', 97, 'close', 3)] },
  ],
} as unknown as CheckResult;

const facts = {
  recipient: 'Ines',
  actor: 'Tobias',
  revision: 'PCA-0617 revision A',
  title: 'Main board',
  result,
  page: 'https://dropwatt.example/revisions/1',
};

test('sent back – its mail – carries board, verdicts, hottest part with margin, reason and one link', () => {
  const { subject, text, holdsToken } = sentBackNotice({ ...facts, reason: '3000 m variant missing.' });
  expect(subject).toBe('PCA-0617 revision A was sent back');
  expect(text).toContain('Tobias sent PCA-0617 revision A (Main board) back.');
  // Worst verdict first.
  expect(text).toContain('1 over, 1 close, 2 within');
  expect(text).toContain('U1 at 121.0\u00a0°C in “Hot, high line”, margin \u221211.0\u00a0K');
  expect(text).toContain('Reason: 3000 m variant missing.');
  expect(text.match(/https?:\/\/\S+/g)).toEqual(['https://dropwatt.example/revisions/1/review']);
  expect(holdsToken).toBe(false);
});

test('submitted – without a note – has no empty paragraph', () => {
  expect(submittedNotice({ ...facts, reason: '' }).text).not.toMatch(/Note|\n{3}/);
});

import { expect, test } from 'vitest';
import type { RevisionView } from '#core/contract/assemblies.ts';
import { nextStep } from '#web/revision/next-step.ts';

const revision = (state: RevisionView['state'], allowed: RevisionView['allowed']): RevisionView => ({
  id: '',
  assembly: { id: '', number: 'PCA-0617', title: '' },
  letter: 'A',
  state,
  version: 1,
  authors: [],
  createdAt: '',
  changedAt: '',
  changedBy: '',
  reasons: [],
  stateReason: null,
  signatures: [],
  openComments: 0,
  allowed,
});

test('next step – in review – depends on what the reader may do', () => {
  expect(nextStep(revision('in review', ['clear', 'send-back'])).text).toBe('Clear it or send it back');
  expect(nextStep(revision('in review', ['send-back'])).text).toContain('another reviewer');
  expect(nextStep(revision('in review', [])).text).toBe('Waits for a thermal reviewer');
});

test('next step – issued – the record', () => {
  expect(nextStep(revision('issued', [])).view).toBe('record');
});

import { z } from 'zod';

export const revisionState = z.enum([
  'sketch',
  'in review',
  'sent back',
  'cleared',
  'issued',
  'superseded',
  'withdrawn',
]);
export type RevisionState = z.output<typeof revisionState>;

/** What moves a revision from one state to the next. `supersede` happens by itself when a later revision is issued. */
export const transitions = {
  submit: { from: ['sketch', 'sent back'], to: 'in review' },
  'send-back': { from: ['in review'], to: 'sent back' },
  clear: { from: ['in review'], to: 'cleared' },
  issue: { from: ['cleared'], to: 'issued' },
  withdraw: { from: ['sketch', 'in review', 'sent back', 'cleared'], to: 'withdrawn' },
  supersede: { from: ['issued'], to: 'superseded' },
} as const satisfies Record<string, { from: readonly RevisionState[]; to: RevisionState }>;

export type Transition = keyof typeof transitions;

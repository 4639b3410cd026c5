import type { RevisionView } from '#core/contract/assemblies.ts';

export type NextStep = { text: string; view: 'sketch' | 'results' | 'review' | 'record' };

/** What the caller may do next, in one sentence, and the page where they do it. */
export function nextStep({ state, allowed, stateReason }: RevisionView): NextStep {
  const may = (action: RevisionView['allowed'][number]) => allowed.includes(action);
  switch (state) {
    case 'sketch':
      return may('submit')
        ? { text: 'Submit it for review when the check holds', view: 'review' }
        : { text: 'Being drawn by its author', view: 'sketch' };
    case 'sent back':
      return may('submit')
        ? {
            text: stateReason ? 'Sent back: read why, change it, submit again' : 'Change it and submit again',
            view: 'review',
          }
        : { text: 'Back with its author', view: 'review' };
    case 'in review':
      if (may('clear')) return { text: 'Clear it or send it back', view: 'review' };
      return may('send-back')
        ? { text: 'You drew on it, so another reviewer clears it', view: 'review' }
        : { text: 'Waits for a thermal reviewer', view: 'review' };
    case 'cleared':
      return may('issue')
        ? { text: 'Issue it', view: 'review' }
        : { text: 'Waits for a quality engineer to issue it', view: 'review' };
    case 'issued':
      return { text: 'Frozen; print the record', view: 'record' };
    case 'superseded':
      return { text: 'A later revision is issued', view: 'record' };
    case 'withdrawn':
      return { text: 'Withdrawn; kept for the record', view: 'record' };
  }
}

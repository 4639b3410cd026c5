import type { RevisionView } from '#core/contract/assemblies.ts';

/** Why the caller has no decision to take now; null where they have one. */
export function refusalText({ state, allowed }: Pick<RevisionView, 'state' | 'allowed'>): string | null {
  const may = (action: RevisionView['allowed'][number]) => allowed.includes(action);
  switch (state) {
    case 'sketch':
    case 'sent back':
      return may('submit') ? null : 'A layout designer or hardware lead submits it when it is ready.';
    case 'in review':
      if (may('clear')) return null;
      return may('send-back')
        ? 'You have drawn on this sketch, and an author never clears their own work: another thermal reviewer does. You can send it back.'
        : 'It waits for a thermal reviewer to clear it or send it back.';
    case 'cleared':
      return may('issue')
        ? null
        : 'It is cleared and waits for a quality engineer who has not drawn on it to issue it.';
    case 'issued':
      return 'It is issued and frozen. A change opens the next revision, on the page of the assembly.';
    case 'superseded':
      return 'A later revision has been issued; this one stays readable as it was.';
    case 'withdrawn':
      return 'It was withdrawn and stays readable as it was.';
  }
}

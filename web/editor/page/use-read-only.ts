import { useEffect } from 'react';
import type { RevisionView } from '#core/contract/assemblies.ts';
import type { EditorStore } from '../editor-store.ts';
import { idle } from '../tools/gesture.ts';

/** Follows what the caller may do with the revision; it can change while the page is open. */
export function useReadOnly(store: EditorStore, revision: Pick<RevisionView, 'state' | 'allowed'>): void {
  const reason = readOnlyReason(revision);
  useEffect(() => {
    store.setState(reason === null ? { readOnly: null } : { readOnly: reason, gesture: idle, live: null });
  }, [store, reason]);
}

/** Why the sketch cannot be changed, in a sentence; null where it can. */
export function readOnlyReason({ state, allowed }: Pick<RevisionView, 'state' | 'allowed'>): string | null {
  if (allowed.includes('edit')) return null;
  return state === 'sketch' || state === 'sent back'
    ? 'You may look at everything. Layout designers and hardware leads may change a sketch.'
    : `The revision is ${state}, so its sketch stays as it is. You may look at everything.`;
}

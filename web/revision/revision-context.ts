import { useOutletContext } from 'react-router-dom';
import type { RevisionView } from '#core/contract/assemblies.ts';

/** The revision whose frame the page stands in; always there, as the frame waits for it. */
export function useRevision(): RevisionView {
  return useOutletContext<RevisionView>();
}

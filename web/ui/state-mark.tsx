import type { ReactNode } from 'react';
import type { RevisionState } from '#core/review/revision-state.ts';

const words: Record<RevisionState, string> = {
  sketch: 'Sketch',
  'in review': 'In review',
  'sent back': 'Sent back',
  cleared: 'Cleared',
  issued: 'Issued',
  superseded: 'Superseded',
  withdrawn: 'Withdrawn',
};

/** A sheet of paper on its way: dashed, whole, returned, ticked, sealed, laid under, struck out. */
const signs: Record<RevisionState, ReactNode> = {
  sketch: <rect x="3" y="2" width="10" height="12" strokeDasharray="2 1.6" />,
  'in review': <path d="M3 2h10v12H3zM5.5 6h5M5.5 8.5h5M5.5 11h3" />,
  'sent back': <path d="M3 2h10v12H3zM10.5 8H5.8M7.8 5.8L5.6 8l2.2 2.2" />,
  cleared: <path d="M3 2h10v12H3zM5.4 8.2l2 2 3.4-4" />,
  issued: (
    <>
      <path d="M3 2h10v12H3z" fill="currentColor" />
      <path d="M5.4 8.2l2 2 3.4-4" stroke="var(--paper)" />
    </>
  ),
  superseded: <path d="M2 4h8v10H2zM5 4V2h9v10h-4" />,
  withdrawn: <path d="M3 2h10v12H3zM3 2l10 12" />,
};

/** State of a revision as word and sign. */
export function StateMark({ state }: { state: RevisionState }) {
  return (
    <span className="inline-flex items-baseline gap-1.5 whitespace-nowrap">
      <svg
        aria-hidden="true"
        width="15"
        height="15"
        viewBox="0 0 16 16"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.3"
        className="relative top-[0.14em] shrink-0"
      >
        {signs[state]}
      </svg>
      {words[state]}
    </span>
  );
}

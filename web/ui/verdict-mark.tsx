import type { ReactNode } from 'react';
import type { Verdict } from '#core/result/result.ts';
import { verdictMeanings, verdictWords } from './verdict-words.ts';

/** Shapes in a box of 16: full disc, half disc, triangle, ring; each tells itself apart without its colour. */
export const verdictShapes: Record<Verdict, ReactNode> = {
  within: <circle cx="8" cy="8" r="6" fill="currentColor" />,
  close: (
    <>
      <circle cx="8" cy="8" r="5.4" fill="none" stroke="currentColor" strokeWidth="1.4" />
      <path d="M2.2 8a5.8 5.8 0 0 0 11.6 0z" fill="currentColor" />
    </>
  ),
  over: <path d="M8 1.6L15 14H1z" fill="currentColor" />,
  'not evaluated': <circle cx="8" cy="8" r="5.2" fill="none" stroke="currentColor" strokeWidth="2" />,
};

export const verdictColours: Record<Verdict, string> = {
  within: 'text-within',
  close: 'text-close',
  over: 'text-over',
  'not evaluated': 'text-unknown',
};

type Props = {
  verdict: Verdict;
  /** Height of the shape in pixels. */
  size?: number;
  /** Shows the shape alone where the word stands nearby; it is still read out. */
  wordHidden?: boolean;
};

/** Verdict as shape, word and colour. */
export function VerdictMark({ verdict, size = 14, wordHidden = false }: Props) {
  return (
    <span
      title={verdictMeanings[verdict]}
      className={`inline-flex items-baseline gap-1.5 font-semibold whitespace-nowrap ${verdictColours[verdict]}`}
    >
      <svg aria-hidden="true" width={size} height={size} viewBox="0 0 16 16" className="relative top-[0.14em] shrink-0">
        {verdictShapes[verdict]}
      </svg>
      <span className={wordHidden ? 'sr-only' : undefined}>{verdictWords[verdict]}</span>
    </span>
  );
}

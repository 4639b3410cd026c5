import type { Verdict } from '#core/result/result.ts';

/** What a verdict says in full, for a tooltip or a summary. */
export const verdictMeanings: Record<Verdict, string> = {
  within: 'Inside the derated limit by more than the stated uncertainty',
  close: 'Inside the derated limit, but not by more than the stated uncertainty',
  over: 'Over the derated limit',
  'not evaluated': 'Something needed for a verdict is missing',
};

export const verdictWords: Record<Verdict, string> = {
  within: 'Within',
  close: 'Close',
  over: 'Over',
  'not evaluated': 'Not evaluated',
};

import type { HeatPath } from './heat-path.ts';

/** A published test board and what the present method makes of it. */
export type PublishedCase = {
  id: string;
  /** Document and place. */
  source: string;
  /** A: everything is stated; A-: nearly; B: one assumption; B-: more than one. */
  grade: string;
  origin: 'measured' | 'simulated';
  /** Package outline. */
  family: string;
  path: HeatPath;
  airMPerS: number;
  /** Junction to ambient, K/W. */
  publishedKPerW: number;
  predictedKPerW: number;
  assumption: string | null;
  /** In what the source contradicts itself; such cases are shown, not counted. */
  contradiction: string | null;
};

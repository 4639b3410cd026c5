import { z } from 'zod';

/** A published test board and what the present method makes of it. */
export const publishedCase = z.strictObject({
  id: z.string(),
  /** Document and place. */
  source: z.string(),
  /** A: everything is stated; A-: nearly; B: one assumption; B-: more than one. */
  grade: z.enum(['A', 'A-', 'B', 'B-']),
  origin: z.enum(['measured', 'simulated']),
  /** Package outline. */
  family: z.string(),
  path: z.enum(['tab', 'pad', 'leads']),
  airMPerS: z.number().nonnegative(),
  /** Junction to ambient, K/W. */
  publishedKPerW: z.number().positive(),
  predictedKPerW: z.number().positive(),
  assumption: z.string().nullable(),
  /** In what the source contradicts itself; such cases are shown, not counted. */
  contradiction: z.string().nullable(),
});

export type PublishedCase = z.output<typeof publishedCase>;

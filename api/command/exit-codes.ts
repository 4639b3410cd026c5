/** What the command line's end says to a script. */
export const exitCodes = {
  /** Everything within or close. */
  fine: 0,
  /** Something over, or something that could not be evaluated: a missing input is never a pass. */
  over: 1,
  /** The document or the command is not valid. */
  invalid: 2,
  /** No converged solution. */
  notConverged: 3,
} as const;

/** A regulator in one condition, designers' units; null where an input is missing. */
export type OperatingPoint = {
  ref: string;
  /** Highest voltage of its feed, before the dropper. */
  feedV: number | null;
  /** At the pin, after the dropper: the highest input of the condition. */
  inputV: number | null;
  /** At the pin with the lowest supply and the lowest output of what feeds it, never below 0 V. */
  lowestInputV: number | null;
  /** The lowest output within the tolerance, or what is left of the input in dropout. */
  outputV: number | null;
  outputA: number | null;
  groundA: number | null;
  dissipationW: number | null;
  /** Whether the output is held at the condition's input. */
  regulating: boolean | null;
  /** Lowest input − droppers − highest output − dropout, V. */
  headroomV: number | null;
  /** Heat of its dropper, W; null where it has one and cannot be computed. */
  dropperW: number | null;
  /** What is missing, in words. */
  missing: string[];
};

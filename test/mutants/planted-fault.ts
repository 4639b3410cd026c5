/** A fault to be planted: an exact text that stands once in a file of the project, and what takes its place. */
export type PlantedFault = {
  /** What goes wrong, in words. */
  fault: string;
  file: string;
  from: string;
  to: string;
  /** Test folders or files that must turn red. */
  tests: readonly string[];
};

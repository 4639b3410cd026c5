import type { PublishedCase } from './published-case.ts';

/** Errors of predicted against published rises, as shares of the published one. */
export type ErrorStatistics = {
  cases: number;
  mean: number;
  meanAbsolute: number;
  rms: number;
  /** Error of the largest size. */
  worst: number;
};

export const errorOf = ({ predictedKPerW, publishedKPerW }: PublishedCase) => predictedKPerW / publishedKPerW - 1;

/** @returns zeros where there is no case */
export function errorStatistics(cases: readonly PublishedCase[]): ErrorStatistics {
  const errors = cases.map(errorOf);
  const n = Math.max(1, errors.length);
  return {
    cases: errors.length,
    mean: errors.reduce((sum, error) => sum + error, 0) / n,
    meanAbsolute: errors.reduce((sum, error) => sum + Math.abs(error), 0) / n,
    rms: Math.sqrt(errors.reduce((sum, error) => sum + error * error, 0) / n),
    worst: errors.reduce((worst, error) => (Math.abs(error) > Math.abs(worst) ? error : worst), 0),
  };
}

export const stillCases = (cases: readonly PublishedCase[]) =>
  cases.filter(({ contradiction, airMPerS }) => contradiction === null && airMPerS === 0);
export const movingCases = (cases: readonly PublishedCase[]) =>
  cases.filter(({ contradiction, airMPerS }) => contradiction === null && airMPerS > 0);

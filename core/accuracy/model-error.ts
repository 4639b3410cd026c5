import type { Condition } from '#core/board/condition.ts';
import { movingCases, stillCases } from './error-statistics.ts';
import type { HeatPath } from './heat-path.ts';
import { publishedAccuracy } from './published-accuracy.ts';
import type { PublishedCase } from './published-case.ts';

/** So many cases of average error stand beside those of a heat path, so that a few lucky ones do not promise too much. */
const priorCases = 4;
/** Fixed films carry no correlation; what is left is copper, laminate and package. An estimate, no published boards. */
const fixedShare = 0.05;

const still = stillCases(publishedAccuracy);
const moving = movingCases(publishedAccuracy);

/** Root mean square of what must be added to a predicted rise to get the published one, as a share of the predicted one. */
function missed(cases: readonly PublishedCase[]): number {
  const sum = cases.reduce((total, one) => total + (one.publishedKPerW / one.predictedKPerW - 1) ** 2, 0);
  return Math.sqrt(sum / Math.max(1, cases.length));
}

/**
 * Model error as a share of the predicted rise, one standard deviation. Still air: what the published boards miss whose packages have
 * the same heat path, drawn towards that of all by four average cases: √((n·e² + 4·E²) ÷ (n + 4)). Moving air: double that of its
 * few cases. A stopped fan is still air.
 * @param path of the package; null: anything else on the board
 */
export function modelErrorShare(condition: Condition, path: HeatPath | null): number {
  if (condition.filmWPerM2K !== null) return fixedShare;
  if (condition.air.kind === 'moving' && condition.fault?.kind !== 'fan-stopped') return movingShare;
  return stillShares[path ?? 'all'];
}

/** Share in still air by heat path. */
export const stillShares: Readonly<Record<HeatPath | 'all', number>> = {
  tab: drawn('tab'),
  pad: drawn('pad'),
  leads: drawn('leads'),
  all: missed(still),
};

/** Share in moving air. */
export const movingShare = 2 * missed(moving);

function drawn(path: HeatPath): number {
  const own = still.filter((one) => one.path === path);
  return Math.sqrt((own.length * missed(own) ** 2 + priorCases * missed(still) ** 2) / (own.length + priorCases));
}

import type { Report } from '../cross-check.ts';
import type { Board } from '../document.ts';

/** A foldback limit folds back. */
export function checkCurrentLimits(board: Board, report: Report) {
  for (const [key, part] of Object.entries(board.parts)) {
    const limit = part.currentLimit;
    if (limit?.kind === 'foldback' && limit.shortA > limit.kneeA) {
      report(
        ['parts', key, 'currentLimit', 'shortA'],
        `must be at most kneeA (${limit.kneeA} A), found ${limit.shortA} A`,
      );
    }
  }
}

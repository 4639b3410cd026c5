import type { Condition } from '#core/board/condition.ts';
import type { BoardModel } from './board-model.ts';
import { boardNotices } from './board-notices.ts';
import { filmNotices } from './film-notices.ts';
import type { ThermalNotice } from './solution.ts';
import type { Rises } from './solve-rises.ts';

/** What the reader of a solution must know about its range of validity. */
export function noticesOf(model: BoardModel, condition: Condition, solved: Rises): ThermalNotice[] {
  const notices: ThermalNotice[] = [];
  for (const nodes of model.packages) {
    if (nodes.lands.every((land) => land.weights.cell.length === 0)) {
      notices.push({ code: 'lands-off-board', ref: nodes.ref, message: `No land of ${nodes.ref} lies on the board.` });
    }
  }
  for (const source of model.sources) {
    if (source.weights.cell.length === 0) {
      notices.push({
        code: 'source-off-board',
        ref: source.ref,
        message: `${source.ref} does not lie on the board; its heat is left out.`,
      });
    }
  }
  notices.push(...boardNotices(model), ...filmNotices(model, condition, solved));
  const hottest = solved.rise.reduce((most, value) => Math.max(most, value), 0);
  if (hottest > 250) {
    notices.push({
      code: 'rise-range',
      ref: null,
      message: `A rise of ${hottest.toFixed(0)} K is beyond the 250 K that the films were checked for.`,
    });
  }
  return notices;
}

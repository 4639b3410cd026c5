import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import { buildBoardModel, type BoardModel } from '#core/thermal/board-model.ts';
import type { HeatInput } from '#core/thermal/solution.ts';
import { solveCondition } from '#core/thermal/solve-condition.ts';
import { rightSide, solveLinear, solveRises } from '#core/thermal/solve-rises.ts';

/** Powers by reference, W: regulators and heat sources of the board in one list. */
export type Powers = Readonly<Record<string, number>>;

export function heatOf({ regulators }: Board, powers: Powers): HeatInput {
  const refs = new Set(regulators.map(({ ref }) => ref));
  const [regulatorsW, sourcesW] = [new Map<string, number>(), new Map<string, number>()];
  for (const [ref, power] of Object.entries(powers)) (refs.has(ref) ? regulatorsW : sourcesW).set(ref, power);
  return { regulatorsW, sourcesW };
}

/** The board's first condition, changed where that is wanted, as the product solves it. */
export function solved(board: Board | BoardModel, powers: Powers, change: Partial<Condition> = {}, cellMm = 1) {
  const model = 'network' in board ? board : buildBoardModel(board, { cellMm });
  return solveCondition(model, { ...model.board.conditions[0]!, ...change }, heatOf(model.board, powers));
}

/** Rises of all nodes with the films as they settled, the linear system solved a thousand times more tightly than usual. */
export function tightRises(model: BoardModel, powers: Powers, change: Partial<Condition> = {}): Float64Array {
  const condition = { ...model.board.conditions[0]!, ...change };
  const heat = heatOf(model.board, powers);
  const { films, ambientK, rise } = solveRises(model, condition, heat);
  const x = rise.slice();
  solveLinear(model, films, rightSide(model, heat, ambientK), x, { tolerance: 1e-12 });
  return x;
}

/** Junction rises over the air by reference, K, from a tight solution. */
export function tightJunctions(model: BoardModel, powers: Powers, change: Partial<Condition> = {}) {
  const x = tightRises(model, powers, change);
  return new Map(model.packages.map(({ ref, junction }) => [ref, x[junction]!]));
}

import type { HeatInput } from '#core/thermal/solution.ts';
import { buildBoardModel, type BoardModel } from '#core/thermal/board-model.ts';
import { rightSide, solveRises, type Rises } from '#core/thermal/solve-rises.ts';
import { hardBoard } from './hard-board.ts';

export type HardModel = { model: BoardModel; heat: HeatInput; rises: Rises; b: Float64Array };

/** A hard board on cells of a size, solved once in still air: its network then keeps the films of that solution, one fixed matrix. */
export function hardModel(seed: number, layers: 2 | 4 | 8, cellMm: number): HardModel {
  const board = hardBoard(seed, layers);
  const model = buildBoardModel(board, { cellMm, correctLands: false });
  const heat = {
    regulatorsW: new Map(board.regulators.map(({ ref, powerW }) => [ref, powerW ?? 0])),
    sourcesW: new Map(),
  };
  const rises = solveRises(model, board.conditions[0]!, heat);
  if (rises.status !== 'converged') throw new Error(`${board.title}: ${rises.message}`);
  return { model, heat, rises, b: rightSide(model, heat, rises.ambientK) };
}

import { buildBoardModel, releaseBoardModel } from '#core/thermal/board-model.ts';
import { solveRises } from '#core/thermal/solve-rises.ts';
import { hardBoard } from './hard-board.ts';
import { median } from './median.ts';

/**
 * S5: a regulator is moved by half a millimetre per frame, its copper stays; each frame builds the model anew (fine geometry, network,
 * hierarchy) on cells of 1 mm and solves it with its films from zero, as a settled answer does.
 * @returns ms per frame and what part of it is the model
 */
export function dragFrame(frames: number): { frameMs: number; modelMs: number } {
  const board = hardBoard(7001, 4);
  const heat = {
    regulatorsW: new Map(board.regulators.map(({ ref, powerW }) => [ref, powerW ?? 0])),
    sourcesW: new Map(),
  };
  const times: number[] = [];
  const models: number[] = [];
  for (let frame = 0; frame < frames; frame++) {
    const [moved, ...others] = board.regulators;
    const at: [number, number] = [moved!.at[0] + 0.5 * frame, moved!.at[1]];
    const began = performance.now();
    const model = buildBoardModel(
      { ...board, regulators: [{ ...moved!, at }, ...others] },
      { cellMm: 1, correctLands: false },
    );
    models.push(performance.now() - began);
    solveRises(model, board.conditions[0]!, heat);
    times.push(performance.now() - began);
    releaseBoardModel(model);
  }
  return { frameMs: median(times), modelMs: median(models) };
}

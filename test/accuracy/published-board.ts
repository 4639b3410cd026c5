import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { heatPathOf } from '#core/accuracy/heat-path.ts';
import type { PublishedCase } from '#core/accuracy/published-case.ts';
import { readBoard } from '#core/board/read-board.ts';
import { buildBoardModel, releaseBoardModel } from '#core/thermal/board-model.ts';
import { solveRises } from '#core/thermal/solve-rises.ts';

const folder = join(import.meta.dirname, '../published');

/** What is published of each board, without what the method makes of it. */
export const published = JSON.parse(readFileSync(join(folder, 'published.json'), 'utf8')) as Omit<
  PublishedCase,
  'path' | 'predictedKPerW'
>[];

export const boardIds = readdirSync(join(folder, 'boards')).map((file) => file.replace('.json', ''));

export function boardOf(id: string) {
  const reading = readBoard(JSON.parse(readFileSync(join(folder, 'boards', `${id}.json`), 'utf8')));
  if (!reading.ok) throw new Error(`${id}: ${reading.faults[0]?.message ?? 'not a board'}`);
  return reading.board;
}

/** Junction to ambient of the board's one regulator, K/W, on the cells that the product chooses, nothing tuned to the case. */
export function predict(one: (typeof published)[number]): PublishedCase {
  const board = boardOf(one.id);
  const [regulator] = board.regulators;
  const power = regulator!.powerW!;
  const model = buildBoardModel(board);
  const rises = solveRises(model, board.conditions[0]!, {
    regulatorsW: new Map([[regulator!.ref, power]]),
    sourcesW: new Map(),
  });
  releaseBoardModel(model);
  if (rises.status !== 'converged') throw new Error(`${one.id}: ${rises.message}`);
  const path = heatPathOf(board.packages[board.parts[regulator!.part]!.package]!);
  return { ...one, path, predictedKPerW: rises.rise[model.packages[0]!.junction]! / power };
}

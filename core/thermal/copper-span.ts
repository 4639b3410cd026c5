import type { BoardModel } from './board-model.ts';

/** Distance between two copper layers by name, m. */
export function copperSpan({ board, layers }: Pick<BoardModel, 'board' | 'layers'>, from: string, to: string): number {
  const depthOf = (name: string) =>
    layers.depth[layers.copper[board.stackup.copper.findIndex((copper) => copper.name === name)] ?? 0] ?? 0;
  return Math.abs(depthOf(to) - depthOf(from));
}

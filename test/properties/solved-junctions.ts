import type { Board } from '#core/board/document.ts';
import { buildBoardModel } from '#core/thermal/board-model.ts';
import { solveCondition } from '#core/thermal/solve-condition.ts';
import { latticeCellMm } from './lattice.ts';

/** Rises over the air of every junction, source and probe of a board, 0.3 W in each part and 0.1 W in each source, K. */
export function solvedRises(board: Board): Map<string, number> {
  const condition = board.conditions[0]!;
  const solution = solveCondition(buildBoardModel(board, { cellMm: latticeCellMm }), condition, {
    regulatorsW: new Map(board.regulators.map(({ ref }) => [ref, 0.3])),
    sourcesW: new Map(board.sources.map(({ ref }) => [ref, 0.1])),
  });
  if (solution.status !== 'converged') throw new Error(solution.message ?? solution.status);
  const airC = condition.ambientC + condition.boxRiseK;
  return new Map([
    ...[...solution.regulators].map(([ref, { junctionC }]) => [ref, junctionC - airC] as const),
    ...[...solution.sources].map(([ref, { meanC }]) => [ref, meanC - airC] as const),
    ...[...solution.probes].map(([id, at]) => [id, at - airC] as const),
  ]);
}

/** Largest distance between two such lists, as a share of the largest rise; what is off the board is so in both. */
export function apart(one: ReadonlyMap<string, number>, other: ReadonlyMap<string, number>): number {
  const most = Math.max(...[...one.values()].filter((rise) => !Number.isNaN(rise)));
  let worst = one.size === other.size ? 0 : Infinity;
  for (const [key, rise] of one) {
    const found = other.get(key) ?? Infinity;
    if (!(Number.isNaN(rise) && Number.isNaN(found))) worst = Math.max(worst, Math.abs(found - rise) / most);
  }
  return worst;
}

import type { Board } from '#core/board/document.ts';
import { formatGiven, formatQuantity } from '#core/format.ts';
import type { FeedNode } from './feed-tree.ts';

/** The two lines under a node's name: what it holds, and what it carries. */
export function feedWords(board: Board, { name, rail }: FeedNode): [string, string] {
  if (rail) {
    const carried = `${formatQuantity(rail.outputA, 'A')}, ${formatQuantity(rail.heatW, 'W')} heat`;
    return [`${formatQuantity(rail.outputV, 'V')}, ${rail.state}`, carried];
  }
  const supply = board.supplies.find((candidate) => candidate.name === name);
  return supply
    ? [
        `supply, nominal ${formatGiven(supply.nominalV, 'V')}`,
        `${formatGiven(supply.minV)} to ${formatGiven(supply.maxV, 'V')}`,
      ]
    : ['supply', ''];
}

/** A node as one sentence, for those who do not see the drawing. */
export function feedSentence(board: Board, node: FeedNode): string {
  const hasDropper = node.rail && board.regulators.find(({ ref }) => ref === node.name)?.dropper;
  return `${node.name}: ${feedWords(board, node).join(', ')}${hasDropper ? ', fed through a dropper' : ''}`;
}

import type { Board } from '#core/board/document.ts';
import { replaced, without } from './in-list.ts';
import { withoutKeys } from './keyed.ts';

/** Takes a supply out, with its voltages in the conditions; what it fed has no feed then. */
export function removeSupply(board: Board, name: string): Board {
  const supplies = without(board.supplies, (supply) => supply.name === name);
  if (supplies === board.supplies) return board;
  return {
    ...board,
    supplies,
    regulators: replaced(
      board.regulators,
      ({ feed }) => feed !== null && 'supply' in feed && feed.supply === name,
      (regulator) => ({ ...regulator, feed: null }),
    ),
    conditions: replaced(
      board.conditions,
      (condition) => name in condition.supplies,
      (condition) => ({ ...condition, supplies: withoutKeys(condition.supplies, new Set([name])) }),
    ),
  };
}

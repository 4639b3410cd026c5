import type { Supply } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import { replaced } from './in-list.ts';
import { renamedKey } from './keyed.ts';

/** Changes a supply; under another name its feeds and conditions follow. The same board where that name is taken. */
export function changeSupply(board: Board, name: string, patch: Partial<Supply>): Board {
  const to = patch.name ?? name;
  if (to !== name && board.supplies.some((supply) => supply.name === to)) return board;
  const supplies = replaced(
    board.supplies,
    (supply) => supply.name === name,
    (supply) => ({ ...supply, ...patch }),
  );
  if (supplies === board.supplies) return board;
  if (to === name) return { ...board, supplies };
  return {
    ...board,
    supplies,
    regulators: replaced(
      board.regulators,
      ({ feed }) => feed !== null && 'supply' in feed && feed.supply === name,
      (regulator) => ({ ...regulator, feed: { supply: to } }),
    ),
    conditions: replaced(
      board.conditions,
      (condition) => name in condition.supplies,
      (condition) => ({ ...condition, supplies: renamedKey(condition.supplies, name, to) }),
    ),
  };
}

import type { Board } from '#core/board/document.ts';
import type { Condition } from '#core/board/condition.ts';
import type { Regulator } from '#core/board/placement.ts';
import { atCurrent } from './current-table.ts';
import { orderByFeed } from './feed-order.ts';

/** Whether the condition's fault is a short circuit at this regulator's output. */
export function isShorted(condition: Condition, { ref }: Pick<Regulator, 'ref'>): boolean {
  return condition.fault?.kind === 'output-short' && condition.fault.ref === ref;
}

/** Current that flows into a regulator's short circuit: its limit, or what it folds back to; null when not stated. */
export function shortCurrent(board: Board, regulator: Regulator): number | null {
  const limit = board.parts[regulator.part]?.currentLimit;
  if (!limit) return null;
  return limit.kind === 'constant' ? limit.limitA : limit.shortA;
}

/**
 * Output and ground current of every regulator, A: its own load and the input currents of those it feeds, carried up the
 * tree. null where a load is missing anywhere below.
 */
export function outputCurrents(
  board: Board,
  condition: Condition,
): Map<string, { outputA: number; groundA: number } | null> {
  const currents = new Map<string, { outputA: number; groundA: number } | null>();
  for (const regulator of orderByFeed(board.regulators).reverse()) {
    const fed = board.regulators.filter(({ feed }) => feed && 'regulator' in feed && feed.regulator === regulator.ref);
    const own = condition.loadsA[regulator.ref] ?? (fed.length > 0 ? 0 : null);
    const isShort = isShorted(condition, regulator);
    const below = fed.map(({ ref }) => currents.get(ref) ?? null);
    const part = board.parts[regulator.part];
    const outputA = isShort
      ? shortCurrent(board, regulator)
      : own === null || below.includes(null)
        ? null
        : own + below.reduce((sum, current) => sum + current!.outputA + current!.groundA, 0);
    currents.set(
      regulator.ref,
      outputA === null || !part ? null : { outputA, groundA: atCurrent(part.groundA, outputA) },
    );
  }
  return currents;
}

import type { BoardDocument } from '#core/board/document.ts';
import { type Board, boardDocument } from '#core/board/document.ts';
import type { Condition } from '#core/board/condition.ts';
import { operatingPoints } from '#core/electrical/operating-points.ts';
import { smallDocument } from '../board/small-board.ts';

type Part = BoardDocument['parts'][string];
type Regulator = BoardDocument['regulators'][number];

type Rail = {
  part?: Partial<Part>;
  regulator?: Partial<Regulator>;
  supply?: { minV: number; nominalV: number; maxV: number };
  condition?: Partial<BoardDocument['conditions'][number]>;
};

/** One regulator U1 of part "five" on supply VIN, in one condition; what is not given is that of the small document. */
export function oneRail({ part = {}, regulator = {}, supply, condition = {} }: Rail): Board {
  const [first] = smallDocument.regulators;
  const { dropper: _, ...plain } = first!;
  return boardDocument.parse({
    ...smallDocument,
    parts: { five: { ...smallDocument.parts.five!, ...part } },
    regulators: [{ ...plain, ...regulator }],
    supplies: [{ name: 'VIN', ...(supply ?? { minV: 9, nominalV: 12, maxV: 15 }) }],
    conditions: [{ ...smallDocument.conditions[0]!, ...condition }],
  });
}

/** Operating point of U1 in the first condition. */
export function pointOf(board: Board, condition: Condition = board.conditions[0]!) {
  return operatingPoints(board, condition).get('U1')!;
}

import { expect, test } from 'vitest';
import { checkBoard } from '#core/check/check-board.ts';
import { boardDocument } from '#core/board/document.ts';
import { ladderSteps } from '#web/ladder/ladder-steps.ts';
import { tinyBoard } from '../../support/tiny-board.ts';

test('ladder – of a checked regulator – climbs from the ambient to its junction, limit on the same scale', () => {
  const { result } = checkBoard(boardDocument.parse(tinyBoard(0.3)), [], { cellMm: 1 });
  const regulator = result.conditions[1]!.regulators[0]!;
  const { steps, limitK } = ladderSteps(regulator);
  expect(steps[0]!.fromK).toBe(0);
  steps.slice(1).forEach((step, index) => expect(step.fromK).toBe(steps[index]!.toK));
  // Ambient 40 °C; the limit is 25 K below the maker's 125 °C.
  expect(steps.at(-1)!.toK).toBeCloseTo(regulator.junctionC! - 40, 6);
  expect(limitK).toBeCloseTo(60, 6);
});

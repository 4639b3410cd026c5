import { expect, test } from 'vitest';
import { blankBoard } from '#core/board/blank-board.ts';
import { readBoard } from '#core/board/read-board.ts';
import { checkBoard } from '#core/check/check-board.ts';

test('blankBoard – read and checked as it is – valid, solved, nothing evaluated and nothing that stops it', () => {
  const reading = readBoard(blankBoard('Fresh'));
  if (!reading.ok) throw new Error(JSON.stringify(reading.faults));
  const { result } = checkBoard(reading.board, reading.assumptions, { cellMm: 5 });
  expect(result.conditions.map(({ status, board }) => [status, board?.maxC])).toEqual([['converged', 25]]);
  expect(result.verdict).toBe('not evaluated');
  expect(result.findings).toEqual([]);
});

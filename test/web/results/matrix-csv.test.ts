import { expect, test } from 'vitest';
import { boardDocument } from '#core/board/document.ts';
import { checkBoard } from '#core/check/check-board.ts';
import { matrixCsv } from '#web/results/matrix-csv.ts';
import { tinyBoard } from '../../support/tiny-board.ts';

test('matrix as CSV – names that a spreadsheet would run – are defused, numbers stay numbers', () => {
  const board = tinyBoard(0.3);
  const conditions = [{ ...board.conditions[0]!, name: '=cmd|"x", hot' }];
  const { result } = checkBoard(boardDocument.parse({ ...board, conditions }), [], { cellMm: 1 });
  const [head, row] = matrixCsv(result).split('\r\n');
  expect(head!.split(',')).toHaveLength(11);
  expect(row).toMatch(/^"'=cmd\|""x"", hot",U1,0\.3,\d+\.\d+,/);
  expect(row).toMatch(/,(within|close)$/);
});

import type { RecordBlock } from '#core/record/record-document.ts';
import type { BlockSetter } from '../block.ts';
import { inkSoft, line } from '../sheet.ts';
import { drawRows, leadOfRows, type RowLayout } from './rows.ts';
import type { Sheet } from '../sheet.ts';

type Pairs = Extract<RecordBlock, { kind: 'pairs' }>;

/** Label and value, a line between them: a table of two columns without a head. */
export const pairsSetter: BlockSetter<Pairs> = {
  lead: (sheet, { rows }) => leadOfRows(sheet, layoutOf(sheet), null, rows.slice(0, 2)),
  draw(sheet, { rows }) {
    drawRows(sheet, layoutOf(sheet), null, rows);
    sheet.y += 9;
  },
};

function layoutOf(sheet: Sheet): RowLayout {
  const label = sheet.width * 0.31;
  return {
    columns: [
      { x: sheet.left, width: label, align: 'left', colour: inkSoft },
      { x: sheet.left + label, width: sheet.width - label, align: 'left' },
    ],
    size: 8.6,
    ruleColour: line,
  };
}

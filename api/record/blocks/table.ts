import type { RecordBlock } from '#core/record/record-document.ts';
import type { BlockSetter } from '../block.ts';
import { inkSoft, line, type Sheet } from '../sheet.ts';
import { lineHeight } from '../typeset.ts';
import { drawRows, leadOfRows, type RowLayout } from './rows.ts';
import { textSetter } from './text.ts';

type Table = Extract<RecordBlock, { kind: 'table' }>;

/** A table whose head is repeated on every page. */
export const tableSetter: BlockSetter<Table> = {
  lead(sheet, table) {
    if (table.rows.length === 0) return table.empty ? lineHeight(9) : 0;
    return leadOfRows(sheet, layoutOf(sheet, table), headOf(table), table.rows.slice(0, 2));
  },
  draw(sheet, table) {
    if (table.rows.length === 0) {
      if (table.empty) textSetter.draw(sheet, { kind: 'text', text: table.empty });
      return;
    }
    drawRows(sheet, layoutOf(sheet, table), headOf(table), table.rows);
    sheet.y += 9;
  },
};

const headOf = ({ columns }: Table) => columns.map(({ title }) => title);

function layoutOf(sheet: Sheet, { columns }: Table): RowLayout {
  const total = columns.reduce((sum, { weight }) => sum + weight, 0);
  let x = sheet.left;
  return {
    columns: columns.map(({ weight, align = 'left' }) => {
      const column = { x, width: (weight / total) * sheet.width, align };
      x += column.width;
      return column;
    }),
    size: 8,
    ruleColour: line,
    headColour: inkSoft,
  };
}

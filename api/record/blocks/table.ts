import type { RecordBlock, RecordCell } from '#core/record/record-document.ts';
import { ensure, heightOf, inkSoft, line, write, type Sheet } from '../sheet.ts';
import { drawVerdict } from '../verdict-mark.ts';

type Table = Extract<RecordBlock, { kind: 'table' }>;

const size = 8;
const padX = 4;
const padY = 2.4;
const markWidth = 10;

/** A table whose head is repeated on every page and whose rows are never cut. */
export function drawTable(sheet: Sheet, table: Table) {
  if (table.rows.length === 0) {
    if (!table.empty) return;
    ensure(sheet, 16);
    write(sheet, table.empty, sheet.left, sheet.y, { width: sheet.width, colour: inkSoft });
    sheet.y += 18;
    return;
  }
  const total = table.columns.reduce((sum, column) => sum + column.weight, 0);
  const widths = table.columns.map((column) => (column.weight / total) * sheet.width);
  const starts = widths.map((_, k) => sheet.left + widths.slice(0, k).reduce((sum, width) => sum + width, 0));
  const headHeight =
    Math.max(
      ...table.columns.map((column, k) => heightOf(sheet, column.title, widths[k]! - 2 * padX, 'semibold', size)),
    ) +
    2 * padY;
  const heights = table.rows.map(
    (row) => Math.max(...row.map((cell, k) => cellHeight(sheet, cell, widths[k]!))) + 2 * padY,
  );

  const head = () => {
    table.columns.forEach((column, k) => {
      write(sheet, column.title, starts[k]! + padX, sheet.y + padY, {
        width: widths[k]! - 2 * padX,
        font: 'semibold',
        size,
        align: column.align ?? 'left',
      });
    });
    sheet.y += headHeight;
    rule(sheet, 0.9, '#1d1b19');
  };
  ensure(sheet, headHeight + heights[0]!);
  head();
  table.rows.forEach((row, index) => {
    if (ensure(sheet, heights[index]!)) head();
    row.forEach((cell, k) => drawCell(sheet, cell, starts[k]!, widths[k]!, table.columns[k]!.align ?? 'left'));
    sheet.y += heights[index]!;
    rule(sheet, 0.4, line);
  });
  sheet.y += 9;
}

function cellHeight(sheet: Sheet, cell: RecordCell, width: number): number {
  const text = typeof cell === 'string' ? cell : cell.verdict;
  const room = width - 2 * padX - (typeof cell === 'string' ? 0 : markWidth);
  return heightOf(sheet, text || ' ', room, 'regular', size);
}

function drawCell(sheet: Sheet, cell: RecordCell, x: number, width: number, align: 'left' | 'right') {
  if (typeof cell === 'string') {
    write(sheet, cell, x + padX, sheet.y + padY, { width: width - 2 * padX, size, align });
    return;
  }
  drawVerdict(sheet, cell.verdict, x + padX, sheet.y + padY + 2);
  write(sheet, cell.verdict, x + padX + markWidth, sheet.y + padY, {
    width: width - 2 * padX - markWidth,
    size,
    font: cell.verdict === 'within' ? 'regular' : 'semibold',
  });
}

function rule(sheet: Sheet, width: number, colour: string) {
  sheet.pdf
    .lineWidth(width)
    .strokeColor(colour)
    .moveTo(sheet.left, sheet.y)
    .lineTo(sheet.left + sheet.width, sheet.y)
    .stroke();
}

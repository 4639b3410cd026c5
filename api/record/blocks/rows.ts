import type { RecordCell } from '#core/record/record-document.ts';
import { ensure, ink, type Sheet } from '../sheet.ts';
import { artifact, group, rule, tagged } from '../structure.ts';
import { lineHeight, linesOf, writeLines, type Style } from '../typeset.ts';
import { drawVerdict } from '../verdict-mark.ts';

export type RowLayout = {
  columns: readonly { x: number; width: number; align: 'left' | 'right'; colour?: string }[];
  size: number;
  ruleColour: string;
  headColour?: string;
};

const padX = 5;
const padY = 2;
const markWidth = 10;

type SetCell = { lines: readonly string[]; style: Style; verdict: Exclude<RecordCell, string>['verdict'] | null };

/**
 * Rows with a line under each. A row is never cut at the foot of a page, but for one that is higher than a page: it goes
 * on on the next. The head stands on every page.
 */
export function drawRows(
  sheet: Sheet,
  layout: RowLayout,
  head: readonly string[] | null,
  rows: readonly (readonly RecordCell[])[],
): void {
  const headCells = head?.map((title, k) => setCell(sheet, layout, title, k, 'semibold')) ?? null;
  const headHeight = headCells ? heightOf(layout, headCells) : 0;
  const pageRoom = sheet.bottom - sheet.top - headHeight;
  group(sheet, 'Table', () => {
    rows.forEach((row, index) => {
      let cells: SetCell[] | null = row.map((cell, k) => setCell(sheet, layout, cell, k));
      const first = index === 0;
      const broken = ensure(sheet, needOf(heightOf(layout, cells), pageRoom) + (first ? headHeight : 0));
      if (headCells && (first || broken)) drawHead(sheet, layout, headCells, headHeight, first);
      while (cells) {
        const most = Math.max(1, Math.floor((sheet.bottom - sheet.y - 2 * padY) / lineHeight(layout.size)));
        const now = cells.map((cell) => ({ ...cell, lines: cell.lines.slice(0, most) }));
        const rest: SetCell[] = cells.map((cell) => ({ ...cell, lines: cell.lines.slice(most), verdict: null }));
        drawRow(sheet, layout, now, 'TD');
        sheet.y += heightOf(layout, now);
        rule(sheet, 0.4, layout.ruleColour);
        cells = rest.some(({ lines }) => lines.length > 0) ? rest : null;
        if (cells && ensure(sheet, sheet.bottom - sheet.top) && headCells)
          drawHead(sheet, layout, headCells, headHeight, false);
      }
    });
  });
}

/** Height of the head and the first row, and of the second where both are low. */
export function leadOfRows(
  sheet: Sheet,
  layout: RowLayout,
  head: readonly string[] | null,
  rows: readonly (readonly RecordCell[])[],
): number {
  const headHeight = head
    ? heightOf(
        layout,
        head.map((title, k) => setCell(sheet, layout, title, k, 'semibold')),
      )
    : 0;
  const pageRoom = sheet.bottom - sheet.top - headHeight;
  const [first = 0, second = 0] = rows.slice(0, 2).map((row) =>
    needOf(
      heightOf(
        layout,
        row.map((cell, k) => setCell(sheet, layout, cell, k)),
      ),
      pageRoom,
    ),
  );
  return headHeight + (first + second < pageRoom / 4 ? first + second : first);
}

/** Room that a row needs to begin: all of its height, or a part of a page where it is higher than a page. */
const needOf = (height: number, pageRoom: number) => (height > pageRoom ? pageRoom / 4 : height);

function setCell(sheet: Sheet, layout: RowLayout, cell: RecordCell, k: number, face?: 'semibold'): SetCell {
  const column = layout.columns[k];
  const verdict = typeof cell === 'string' ? null : cell.verdict;
  const text = typeof cell === 'string' ? cell : cell.verdict;
  const bold = face ?? (verdict && verdict !== 'within' ? 'semibold' : 'regular');
  const style: Style = {
    face: bold,
    size: layout.size,
    colour: (face ? layout.headColour : column?.colour) ?? ink,
    align: column?.align ?? 'left',
  };
  const width = (column?.width ?? 0) - 2 * padX - (verdict ? markWidth : 0);
  return { lines: linesOf(sheet, text, width, style), style, verdict };
}

function heightOf(layout: RowLayout, cells: readonly SetCell[]): number {
  return Math.max(1, ...cells.map((cell) => cell.lines.length)) * lineHeight(layout.size) + 2 * padY;
}

/** A repeated head is no part of what is read out. */
function drawHead(sheet: Sheet, layout: RowLayout, cells: readonly SetCell[], height: number, first: boolean) {
  if (first) drawRow(sheet, layout, cells, 'TH');
  else artifact(sheet, 'Pagination', () => cells.forEach((cell, k) => drawCell(sheet, layout, cell, k)));
  sheet.y += height;
  rule(sheet, 0.9, ink);
}

function drawRow(sheet: Sheet, layout: RowLayout, cells: readonly SetCell[], type: 'TH' | 'TD') {
  group(sheet, 'TR', () => {
    cells.forEach((cell, k) => tagged(sheet, type, () => drawCell(sheet, layout, cell, k)));
  });
}

function drawCell(sheet: Sheet, { columns }: RowLayout, { lines, style, verdict }: SetCell, k: number) {
  const column = columns[k];
  if (!column) return;
  const x = column.x + padX;
  const shift = verdict ? markWidth : 0;
  if (verdict) drawVerdict(sheet, verdict, x, sheet.y + padY + 1.6);
  writeLines(sheet, lines, x + shift, sheet.y + padY, column.width - 2 * padX - shift, style);
}

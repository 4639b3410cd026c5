import type { RecordHeader } from '#core/record/record-document.ts';
import { pageMark, stateWords } from '#core/record/state-words.ts';
import { subjectOf } from './header.ts';
import { ink, inkSoft, type Sheet } from './sheet.ts';
import { artifact } from './structure.ts';
import { widthOf, writeLine } from './typeset.ts';

const pageWidth = 70;

/** Head and foot of every page, written when the number of pages is known. */
export function drawFeet(sheet: Sheet, header: RecordHeader) {
  const { pdf } = sheet;
  const { count } = pdf.bufferedPageRange();
  for (let page = 0; page < count; page++) {
    pdf.switchToPage(page);
    artifact(sheet, 'Pagination', () => {
      drawMark(sheet, pageMark(header.state));
      drawFoot(sheet, header, page + 1, count);
    });
  }
}

/** Framed, at the head of the page: this paper is not the issued record. */
function drawMark(sheet: Sheet, mark: string | null) {
  if (mark === null) return;
  const style = { face: 'semibold', size: 9.5 } as const;
  const text = mark.toUpperCase();
  const width = Math.min(sheet.width, widthOf(sheet, text, style) + 20);
  const x = sheet.left + sheet.width - width;
  sheet.pdf.lineWidth(1.2).strokeColor(ink).rect(x, 24, width, 18).stroke();
  writeLine(sheet, text, x + 10, 26.6, width - 18, style);
}

function drawFoot(sheet: Sheet, header: RecordHeader, page: number, count: number) {
  const y = sheet.pageHeight - 42;
  const room = sheet.width - pageWidth;
  sheet.pdf
    .lineWidth(0.5)
    .strokeColor(inkSoft)
    .moveTo(sheet.left, y - 5)
    .lineTo(sheet.left + sheet.width, y - 5)
    .stroke();
  const soft = { size: 7.6, colour: inkSoft } as const;
  writeLine(
    sheet,
    `Derating record  ·  ${stateWords[header.state]}  ·  ${subjectOf(header)}`,
    sheet.left,
    y,
    room,
    soft,
  );
  const hashes = `content ${header.inputHash.slice(0, 23)}  ·  record ${header.digest.slice(0, 23)}  ·  method ${header.method}`;
  writeLine(sheet, hashes, sheet.left, y + 10, room, soft);
  writeLine(sheet, `page ${page} of ${count}`, sheet.left + room, y, pageWidth, { size: 8.2, align: 'right' });
}

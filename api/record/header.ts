import { formatTime } from '#core/record/format-time.ts';
import type { RecordHeader } from '#core/record/record-document.ts';
import { copper, heightOf, inkSoft, write, type Sheet } from './sheet.ts';
import { drawPairs } from './blocks/text.ts';
import { drawVerdict } from './verdict-mark.ts';

export const stateWords: Record<RecordHeader['state'], string> = {
  sketch: 'Sketch – not issued',
  'in review': 'In review – not issued',
  'sent back': 'Sent back – not issued',
  cleared: 'Cleared – not issued',
  issued: 'Issued',
  superseded: 'Superseded by a later revision',
  withdrawn: 'Withdrawn',
  document: 'Board document – not issued',
};

/** Title block of the first page. */
export function drawHeader(sheet: Sheet, header: RecordHeader) {
  write(sheet, 'Derating record', sheet.left, sheet.y, { width: sheet.width, font: 'semibold', size: 20 });
  sheet.y += 27;
  sheet.pdf.rect(sheet.left, sheet.y, sheet.width, 2).fill(copper);
  sheet.y += 8;
  const name = header.letter ? `${header.assembly}, revision ${header.letter}` : header.assembly;
  const height = heightOf(sheet, name, sheet.width, 'semibold', 13);
  write(sheet, name, sheet.left, sheet.y, { width: sheet.width, font: 'semibold', size: 13 });
  sheet.y += height + 4;
  drawVerdict(sheet, header.verdict, sheet.left, sheet.y + 2, 9);
  write(sheet, `${header.verdict}  ·  ${stateWords[header.state]}`, sheet.left + 15, sheet.y, {
    width: sheet.width - 15,
    font: 'semibold',
    size: 11,
  });
  sheet.y += 20;
  drawPairs(sheet, {
    kind: 'pairs',
    rows: [
      ['Sketch', header.title],
      ['Content hash', header.inputHash],
      ['Method version', header.method],
      ['Date of the revision (UTC)', header.changedAt ? formatTime(header.changedAt) : 'none: printed from a document'],
      ['Authors', header.authors.join(', ') || 'none stated'],
    ],
  });
}

/** Foot of every page, written when the number of pages is known; a state other than issued stands across the head. */
export function drawFeet(sheet: Sheet, header: RecordHeader) {
  const { pdf } = sheet;
  const { count } = pdf.bufferedPageRange();
  const name = header.letter ? `${header.assembly}, revision ${header.letter}` : header.assembly;
  const isFinal = header.state === 'issued';
  for (let page = 0; page < count; page++) {
    pdf.switchToPage(page);
    const y = sheet.pageHeight - 40;
    pdf
      .lineWidth(0.5)
      .strokeColor(inkSoft)
      .moveTo(sheet.left, y - 5)
      .lineTo(sheet.left + sheet.width, y - 5)
      .stroke();
    const room = sheet.width - 90;
    write(sheet, clipped(sheet, `${name}  ·  ${stateWords[header.state]}`, room), sheet.left, y, {
      width: room,
      size: 7.6,
      colour: inkSoft,
      single: true,
    });
    write(sheet, `${header.inputHash.slice(0, 23)}…  ·  method ${header.method}`, sheet.left, y + 10, {
      width: room,
      size: 7.6,
      colour: inkSoft,
      single: true,
    });
    write(sheet, `page ${page + 1} of ${count}`, sheet.left + sheet.width - 90, y, {
      width: 90,
      size: 8,
      align: 'right',
    });
    if (!isFinal) {
      write(sheet, stateWords[header.state].toUpperCase(), sheet.left, 24, {
        width: sheet.width,
        font: 'semibold',
        size: 9,
        align: 'center',
        colour: inkSoft,
      });
    }
  }
}

function clipped(sheet: Sheet, text: string, width: number): string {
  sheet.pdf.font('regular').fontSize(7.6);
  if (sheet.pdf.widthOfString(text) <= width) return text;
  let end = text.length;
  while (end > 0 && sheet.pdf.widthOfString(`${text.slice(0, end)}…`) > width) end--;
  return `${text.slice(0, end)}…`;
}

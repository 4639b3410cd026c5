import type { RecordBlock, RecordDocument } from '#core/record/record-document.ts';
import { drawBoard } from './blocks/drawing.ts';
import { drawLadders } from './blocks/ladders.ts';
import { drawTable } from './blocks/table.ts';
import { drawCaution, drawHeading, drawNotice, drawPairs, drawText } from './blocks/text.ts';
import { drawFeet, drawHeader } from './header.ts';
import { ensure, openSheet, write, type Paper, type Sheet } from './sheet.ts';

/** Date of a document that belongs to no revision: fixed, as the record must not depend on when it is printed. */
const undated = new Date('2000-01-01T00:00:00Z');
/** Height that a drawing with its legend may take, points. */
const roomForDrawing = 350;

/**
 * The record as a PDF: light, readable in grey, fonts embedded, text selectable, sections as bookmarks.
 * The bytes depend on the record and the paper alone.
 */
export async function renderRecord(record: RecordDocument, paper: Paper): Promise<Buffer> {
  const { header } = record;
  const sheet = openSheet(paper, {
    title: `Derating record ${header.assembly}${header.letter ? ` revision ${header.letter}` : ''}`,
    date: header.changedAt ? new Date(header.changedAt) : undated,
  });
  const finished = collect(sheet.pdf);
  drawHeader(sheet, header);
  record.sections.forEach((section, index) => {
    // A section's title stays with what follows it.
    ensure(sheet, section.blocks[0]?.kind === 'drawing' ? roomForDrawing : 90);
    sheet.y += 6;
    sheet.pdf.outline.addItem(section.title);
    write(sheet, `${index + 1}  ${section.title}`, sheet.left, sheet.y, {
      width: sheet.width,
      font: 'semibold',
      size: 13,
    });
    sheet.y += 19;
    for (const block of section.blocks) drawBlock(sheet, block);
  });
  drawFeet(sheet, header);
  sheet.pdf.end();
  return await finished;
}

function drawBlock(sheet: Sheet, block: RecordBlock) {
  switch (block.kind) {
    case 'heading':
      return drawHeading(sheet, block);
    case 'text':
      return drawText(sheet, block);
    case 'notice':
      return drawNotice(sheet, block);
    case 'caution':
      return drawCaution(sheet, block);
    case 'pairs':
      return drawPairs(sheet, block);
    case 'table':
      return drawTable(sheet, block);
    case 'ladders':
      return drawLadders(sheet, block.ladders);
    case 'drawing':
      return drawBoard(sheet, block.drawing);
  }
}

function collect(pdf: PDFKit.PDFDocument): Promise<Buffer> {
  return new Promise((done, failed) => {
    const chunks: Buffer[] = [];
    pdf.on('data', (chunk: Buffer) => chunks.push(chunk));
    pdf.on('end', () => done(Buffer.concat(chunks)));
    pdf.on('error', failed);
  });
}

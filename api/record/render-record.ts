import { setImmediate } from 'node:timers/promises';
import type { RecordBlock, RecordDocument, RecordSection } from '#core/record/record-document.ts';
import type { BlockSetter } from './block.ts';
import { copperSetter } from './blocks/copper.ts';
import { heatSetter } from './blocks/heat.ts';
import { laddersSetter } from './blocks/ladders.ts';
import { cautionSetter, noticeSetter } from './blocks/framed.ts';
import { pairsSetter } from './blocks/pairs.ts';
import { tableSetter } from './blocks/table.ts';
import { headingSetter, listSetter, textSetter } from './blocks/text.ts';
import { drawFeet } from './feet.ts';
import { drawHeader, subjectOf } from './header.ts';
import { ensure, openSheet, type Paper, type Sheet } from './sheet.ts';
import { openGroup, tagged } from './structure.ts';
import { lineHeight, writeLines } from './typeset.ts';

/**
 * The record as a PDF: light, readable in grey, fonts embedded, tagged, sections as bookmarks.
 * The bytes depend on the record and the paper alone.
 */
export async function renderRecord(record: RecordDocument, paper: Paper): Promise<Buffer> {
  const { header } = record;
  const sheet = openSheet(paper, {
    title: `Derating record ${subjectOf(header)}`,
    subject: header.title,
    date: header.changedAt ? new Date(header.changedAt) : null,
  });
  const finished = collect(sheet.pdf);
  drawHeader(sheet, header);
  for (const [index, section] of record.sections.entries()) await drawSection(sheet, section, index + 1);
  drawFeet(sheet, header);
  sheet.parent.end();
  sheet.pdf.end();
  return await finished;
}

const title = { face: 'semibold', size: 13 } as const;
const titleHeight = lineHeight(title.size) + 4;

async function drawSection(sheet: Sheet, { title: words, blocks }: RecordSection, number: number) {
  ensure(sheet, 8 + titleHeight + leadOf(sheet, blocks, 0));
  if (sheet.y > sheet.top) sheet.y += 8;
  const bookmark = sheet.pdf.outline.addItem(`${number} ${words}`);
  const close = openGroup(sheet, 'Sect');
  tagged(sheet, 'H2', () => writeLines(sheet, [`${number}  ${words}`], sheet.left, sheet.y, sheet.width, title));
  sheet.y += titleHeight;
  for (const [index, block] of blocks.entries()) {
    if (block.kind === 'heading') {
      ensure(sheet, leadOf(sheet, blocks, index));
      bookmark.addItem(block.text);
    }
    setterOf(block).draw(sheet);
    // A long record takes seconds; whoever else waits for this process is served in between.
    await setImmediate();
  }
  close();
}

/**
 * Height that the block needs to begin on a page. A heading needs what follows it as well, and so does the text that
 * introduces a table or a drawing.
 */
function leadOf(sheet: Sheet, blocks: readonly RecordBlock[], index: number): number {
  const block = blocks[index];
  if (!block) return 0;
  const next = blocks[index + 1]?.kind;
  const leadsIn = block.kind === 'heading' || (block.kind === 'text' && next !== 'text' && next !== 'heading');
  return setterOf(block).lead(sheet) + (leadsIn ? leadOf(sheet, blocks, index + 1) : 0);
}

function setterOf(block: RecordBlock): { lead(sheet: Sheet): number; draw(sheet: Sheet): void } {
  switch (block.kind) {
    case 'heading':
      return bound(headingSetter, block);
    case 'text':
      return bound(textSetter, block);
    case 'list':
      return bound(listSetter, block);
    case 'notice':
      return bound(noticeSetter, block);
    case 'caution':
      return bound(cautionSetter, block);
    case 'pairs':
      return bound(pairsSetter, block);
    case 'table':
      return bound(tableSetter, block);
    case 'ladders':
      return bound(laddersSetter, block);
    case 'copper':
      return bound(copperSetter, block);
    case 'heat':
      return bound(heatSetter, block);
  }
}

function bound<B>(setter: BlockSetter<B>, block: B) {
  return { lead: (sheet: Sheet) => setter.lead(sheet, block), draw: (sheet: Sheet) => setter.draw(sheet, block) };
}

function collect(pdf: PDFKit.PDFDocument): Promise<Buffer> {
  return new Promise((done, failed) => {
    const chunks: Buffer[] = [];
    pdf.on('data', (chunk: Buffer) => chunks.push(chunk));
    pdf.on('end', () => done(Buffer.concat(chunks)));
    pdf.on('error', failed);
  });
}

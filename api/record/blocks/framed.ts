import type { RecordBlock } from '#core/record/record-document.ts';
import type { BlockSetter } from '../block.ts';
import { ensure, ink, type Sheet } from '../sheet.ts';
import { artifact, tagged } from '../structure.ts';
import { lineHeight, linesOf, writeLines } from '../typeset.ts';

type Of<K extends RecordBlock['kind']> = Extract<RecordBlock, { kind: K }>;

const size = 8.8;
const padX = 8;
const padY = 4;

/** An exceedance or a state: a frame and the word, but no sign of danger. */
export const noticeSetter: BlockSetter<Of<'notice'>> = {
  lead: (sheet, { text }) => leadOf(sheet, text),
  draw: (sheet, { text }) => drawFramed(sheet, 'NOTICE', text, 0.6),
};

const hazards = {
  'hot-surface': 'Hot surface',
  laminate: 'Laminate',
  neighbour: 'Neighbouring part',
  fire: 'Fire',
  general: 'Burns and fire',
} as const;

/** A hazard to people, with the signal word that ANSI Z535 keeps for it. */
export const cautionSetter: BlockSetter<Of<'caution'>> = {
  lead: (sheet, block) => leadOf(sheet, cautionText(block)),
  draw: (sheet, block) => drawFramed(sheet, `CAUTION  ·  ${hazards[block.caution.kind]}`, cautionText(block), 1.6),
};

function cautionText({ caution }: Of<'caution'>): string {
  return caution.condition ? `${caution.message} Condition: ${caution.condition}.` : caution.message;
}

function leadOf(sheet: Sheet, text: string): number {
  const lines = linesOf(sheet, text, sheet.width - 2 * padX, { size }).length;
  return (Math.min(lines, 4) + 1) * lineHeight(size) + 2 * padY;
}

/** Framed text; where it is longer than a page, the frame goes on on the next one. */
function drawFramed(sheet: Sheet, word: string, text: string, border: number) {
  const inner = sheet.width - 2 * padX;
  let rest = linesOf(sheet, text, inner, { size });
  let head = [word];
  while (rest.length > 0) {
    const whole = (head.length + rest.length) * lineHeight(size) + 2 * padY;
    ensure(sheet, Math.min(whole, sheet.bottom - sheet.top));
    const room = Math.floor((sheet.bottom - sheet.y - 2 * padY) / lineHeight(size)) - head.length;
    const piece = rest.slice(0, room);
    const height = (head.length + piece.length) * lineHeight(size) + 2 * padY;
    const [top, titles] = [sheet.y, head];
    artifact(sheet, 'Layout', () => {
      sheet.pdf.lineWidth(border).strokeColor(ink).rect(sheet.left, top, sheet.width, height).stroke();
    });
    tagged(sheet, 'Note', () => {
      writeLines(sheet, titles, sheet.left + padX, top + padY, inner, { face: 'semibold', size });
      writeLines(sheet, piece, sheet.left + padX, top + padY + titles.length * lineHeight(size), inner, { size });
    });
    sheet.y += height + 6;
    rest = rest.slice(room);
    head = [`${word} (continued)`];
  }
}

import type { RecordBlock } from '#core/record/record-document.ts';
import { copper, ensure, heightOf, ink, inkSoft, line, write, type Sheet } from '../sheet.ts';

type Of<K extends RecordBlock['kind']> = Extract<RecordBlock, { kind: K }>;

export function drawHeading(sheet: Sheet, { text }: Of<'heading'>) {
  const height = heightOf(sheet, text, sheet.width, 'semibold', 10);
  // A heading stays with what follows it.
  ensure(sheet, height + 56);
  sheet.y += 3;
  write(sheet, text, sheet.left, sheet.y, { width: sheet.width, font: 'semibold', size: 10, colour: copper });
  sheet.y += height + 3;
}

export function drawText(sheet: Sheet, { text }: Of<'text'>) {
  const height = heightOf(sheet, text, sheet.width, 'regular', 9);
  ensure(sheet, Math.min(height, 60));
  write(sheet, text, sheet.left, sheet.y, { width: sheet.width });
  sheet.y += height + 6;
}

/** An exceedance or a state: a frame and the word, but no sign of danger. */
export function drawNotice(sheet: Sheet, { text }: Of<'notice'>) {
  framed(sheet, 'Notice', text, 0.6);
}

const hazards = {
  'hot-surface': 'Hot surface',
  laminate: 'Laminate',
  neighbour: 'Neighbouring part',
  fire: 'Fire',
  general: 'Burns and fire',
} as const;

/** A hazard to people, with the word that ANSI Z535 keeps for it. */
export function drawCaution(sheet: Sheet, { caution }: Of<'caution'>) {
  const place = caution.condition ? ` In condition “${caution.condition}”.` : '';
  framed(sheet, `CAUTION · ${hazards[caution.kind]}`, `${caution.message}${place}`, 1.4);
}

function framed(sheet: Sheet, word: string, text: string, border: number) {
  const inner = sheet.width - 16;
  const height = heightOf(sheet, text, inner, 'regular', 8.6) + 12 + 10;
  ensure(sheet, height + 5);
  sheet.pdf.lineWidth(border).strokeColor(ink).rect(sheet.left, sheet.y, sheet.width, height).stroke();
  write(sheet, word, sheet.left + 8, sheet.y + 4, { width: inner, font: 'semibold', size: 8.6 });
  write(sheet, text, sheet.left + 8, sheet.y + 16, { width: inner, size: 8.6 });
  sheet.y += height + 6;
}

export function drawPairs(sheet: Sheet, { rows }: Of<'pairs'>) {
  const labelWidth = sheet.width * 0.34;
  for (const [label, value] of rows) {
    const height = Math.max(
      heightOf(sheet, value, sheet.width - labelWidth, 'regular', 8.6),
      heightOf(sheet, label, labelWidth - 8, 'regular', 8.6),
    );
    ensure(sheet, height + 4);
    write(sheet, label, sheet.left + 3, sheet.y + 1.5, { width: labelWidth - 8, size: 8.6, colour: inkSoft });
    write(sheet, value, sheet.left + labelWidth, sheet.y + 1.5, { width: sheet.width - labelWidth, size: 8.6 });
    sheet.y += height + 3;
    sheet.pdf
      .lineWidth(0.4)
      .strokeColor(line)
      .moveTo(sheet.left, sheet.y)
      .lineTo(sheet.left + sheet.width, sheet.y)
      .stroke();
  }
  sheet.y += 9;
}

import { type Face, type Sheet, ink } from './sheet.ts';

export type Style = { face?: Face; size: number; colour?: string; align?: 'left' | 'right' | 'center' };

const leading = 1.28;

export const lineHeight = (size: number) => size * leading;

/**
 * Text in lines of at most `width`, in points. Lines are made here and not by pdfkit, so that nothing can start a page or
 * run out of a column: a word that is longer than the column is broken where it must be.
 */
export function linesOf(sheet: Sheet, text: string, width: number, { face = 'regular', size }: Style): string[] {
  const { pdf } = sheet;
  pdf.font(face).fontSize(size);
  const fits = (words: string) => pdf.widthOfString(words) <= width;
  const lines: string[] = [];
  for (const paragraph of printable(sheet, text).split('\n')) {
    let line = '';
    for (const word of paragraph.split(/[ \t]+/)) {
      const longer = line === '' ? word : `${line} ${word}`;
      if (fits(longer)) {
        line = longer;
        continue;
      }
      if (line !== '') lines.push(line);
      line = word;
      while (!fits(line)) {
        const head = longestHead(line, fits);
        lines.push(head);
        line = line.slice(head.length);
      }
    }
    lines.push(line);
  }
  return lines;
}

/** Lines from `y` down. @returns their height */
export function writeLines(
  { pdf }: Sheet,
  lines: readonly string[],
  x: number,
  y: number,
  width: number,
  { face = 'regular', size, colour = ink, align = 'left' }: Style,
): number {
  pdf.font(face).fontSize(size).fillColor(colour);
  lines.forEach((line, index) => {
    if (line === '') return;
    const spare = align === 'left' ? 0 : width - pdf.widthOfString(line);
    const indent = align === 'center' ? spare / 2 : spare;
    pdf.text(line, x + indent, y + index * lineHeight(size), { lineBreak: false });
  });
  return lines.length * lineHeight(size);
}

/** One line, cut with an ellipsis where it is too long. */
export function writeLine(sheet: Sheet, text: string, x: number, y: number, width: number, style: Style): void {
  const { pdf } = sheet;
  pdf.font(style.face ?? 'regular').fontSize(style.size);
  const line = printable(sheet, text).replaceAll('\n', ' ');
  const fits = (words: string) => pdf.widthOfString(words) <= width;
  const cut = fits(line) ? line : `${longestHead(line, (words) => fits(`${words}…`))}…`;
  writeLines(sheet, [cut], x, y, width, style);
}

export function widthOf(sheet: Sheet, text: string, { face = 'regular', size }: Style): number {
  return sheet.pdf.font(face).fontSize(size).widthOfString(printable(sheet, text));
}

/** The longest head of a word that fits, at least one character; never half of a surrogate pair. */
function longestHead(word: string, fits: (words: string) => boolean): string {
  const characters = Array.from(word);
  let low = 1;
  let high = characters.length;
  while (low < high) {
    const middle = Math.ceil((low + high) / 2);
    if (fits(characters.slice(0, middle).join(''))) low = middle;
    else high = middle - 1;
  }
  return characters.slice(0, low).join('');
}

type FontOfPdfkit = { _font: { font: { hasGlyphForCodePoint(codePoint: number): boolean } } };

/**
 * Text as the fonts can show it. A character that they lack is written as its code point, "[U+6F22]": pdfkit would print
 * an empty box, and a record must not lose a letter of a name.
 */
function printable({ pdf }: Sheet, text: string): string {
  // pdfkit's types leave the current font out.
  const { font } = (pdf as unknown as FontOfPdfkit)._font;
  let out = '';
  for (const character of text
    .normalize('NFC')
    .replace(/\r\n?/g, '\n')
    .replace(/\u00ad|\u200b|\u200c|\u200d|\ufe0f/g, '')) {
    const codePoint = character.codePointAt(0) ?? 0;
    const known = character === '\n' || character === '\t' || font.hasGlyphForCodePoint(codePoint);
    out += known ? character : `[U+${codePoint.toString(16).toUpperCase().padStart(4, '0')}]`;
  }
  return out;
}

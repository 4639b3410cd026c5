import { createRequire } from 'node:module';
import PDFDocument from 'pdfkit';

const require = createRequire(import.meta.url);
const fonts = {
  regular: require.resolve('source-sans/TTF/SourceSans3-Regular.ttf'),
  semibold: require.resolve('source-sans/TTF/SourceSans3-Semibold.ttf'),
};

export const ink = '#1d1b19';
export const inkSoft = '#55504a';
export const line = '#b9b2a6';
export const copper = '#a94f28';

export type Paper = 'a4' | 'letter';
const sizes: Record<Paper, [number, number]> = { a4: [595.28, 841.89], letter: [612, 792] };
const margin = { left: 46, right: 46, top: 50, bottom: 62 };

/** A PDF with a cursor that runs down the page; points, origin at the top left. */
export type Sheet = {
  pdf: PDFKit.PDFDocument;
  left: number;
  width: number;
  top: number;
  bottom: number;
  pageHeight: number;
  y: number;
};

/** @param date stands in every date field, so that the same record gives the same bytes */
export function openSheet(paper: Paper, about: { title: string; date: Date }): Sheet {
  const [pageWidth, pageHeight] = sizes[paper];
  const pdf = new PDFDocument({
    size: sizes[paper],
    margins: { left: 0, right: 0, top: 0, bottom: 0 },
    bufferPages: true,
    autoFirstPage: true,
    lang: 'en',
    displayTitle: true,
    info: {
      Title: about.title,
      Producer: 'Dropwatt',
      Creator: 'Dropwatt',
      CreationDate: about.date,
      ModDate: about.date,
    },
  });
  pdf.registerFont('regular', fonts.regular);
  pdf.registerFont('semibold', fonts.semibold);
  pdf.font('regular').fontSize(9).fillColor(ink);
  return {
    pdf,
    left: margin.left,
    width: pageWidth - margin.left - margin.right,
    top: margin.top,
    bottom: pageHeight - margin.bottom,
    pageHeight,
    y: margin.top,
  };
}

/** Starts a page when less than `height` is left on this one. @returns whether it did */
export function ensure(sheet: Sheet, height: number): boolean {
  if (sheet.y + height <= sheet.bottom || sheet.y === sheet.top) return false;
  sheet.pdf.addPage();
  sheet.y = sheet.top;
  return true;
}

/** Text that pdfkit may wrap in a column, and nothing else: no page of its own making. */
export function heightOf(
  sheet: Sheet,
  text: string,
  width: number,
  font: 'regular' | 'semibold',
  size: number,
): number {
  return sheet.pdf.font(font).fontSize(size).heightOfString(breakable(text), { width, lineGap: 1 });
}

export function write(
  sheet: Sheet,
  text: string,
  x: number,
  y: number,
  options: {
    width: number;
    font?: 'regular' | 'semibold';
    size?: number;
    colour?: string;
    align?: 'left' | 'right' | 'center';
    single?: boolean;
  },
) {
  sheet.pdf
    .font(options.font ?? 'regular')
    .fontSize(options.size ?? 9)
    .fillColor(options.colour ?? ink)
    .text(options.single ? text : breakable(text), x, y, {
      width: options.width,
      align: options.align ?? 'left',
      lineGap: 1,
      ...(options.single ? { lineBreak: false } : {}),
    });
}

/** Lets a word that is longer than a column be broken: pdfkit would let it run out of the table. */
function breakable(text: string): string {
  return text.replace(/[^\s\u200b]{28}(?=[^\s\u200b])/g, '$&\u200b');
}

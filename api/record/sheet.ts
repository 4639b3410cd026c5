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

export type Face = keyof typeof fonts;
export type Paper = 'a4' | 'letter';
/** Points: 210 × 297 mm and 8.5 × 11 in. */
export const paperSizes: Record<Paper, [number, number]> = { a4: [595.28, 841.89], letter: [612, 792] };
const margin = { left: 48, right: 44, top: 56, bottom: 60 };

/** A PDF with a cursor that runs down the page; points, origin at the top left. */
export type Sheet = {
  pdf: PDFKit.PDFDocument;
  left: number;
  width: number;
  top: number;
  bottom: number;
  pageHeight: number;
  y: number;
  /** Structure element that what is drawn next belongs to. */
  parent: PDFKit.PDFStructureElement;
};

/** Goes into the file's identifier of a record without a date, and into no field that a reader sees. */
const undated = new Date('2000-01-01T00:00:00Z');

/** Without the XMP stream: pdfkit writes names into it without escaping, and cannot leave out its date. */
class RecordPdf extends PDFDocument {
  override endMetadata(): void {}
}

/** @param about.date stands in every date field, so that the same record gives the same bytes; null: no date is stated */
export function openSheet(paper: Paper, about: { title: string; subject: string; date: Date | null }): Sheet {
  const [pageWidth, pageHeight] = paperSizes[paper];
  const date = about.date ?? undated;
  const pdf = new RecordPdf({
    size: paperSizes[paper],
    margins: { left: 0, right: 0, top: 0, bottom: 0 },
    bufferPages: true,
    autoFirstPage: true,
    pdfVersion: '1.7',
    tagged: true,
    lang: 'en',
    displayTitle: true,
    info: {
      Title: about.title,
      Subject: about.subject,
      Producer: 'Dropwatt',
      Creator: 'Dropwatt',
      CreationDate: date,
      ModDate: date,
    },
  });
  if (!about.date) {
    delete pdf.info.CreationDate;
    delete pdf.info.ModDate;
  }
  pdf.registerFont('regular', fonts.regular);
  pdf.registerFont('semibold', fonts.semibold);
  pdf.font('regular').fontSize(9).fillColor(ink);
  const parent = pdf.struct('Document');
  pdf.addStructure(parent);
  return {
    pdf,
    left: margin.left,
    width: pageWidth - margin.left - margin.right,
    top: margin.top,
    bottom: pageHeight - margin.bottom,
    pageHeight,
    y: margin.top,
    parent,
  };
}

/** Starts a page when less than `height` is left on this one. @returns whether it did */
export function ensure(sheet: Sheet, height: number): boolean {
  if (sheet.y + height <= sheet.bottom || sheet.y === sheet.top) return false;
  sheet.pdf.addPage();
  sheet.y = sheet.top;
  return true;
}

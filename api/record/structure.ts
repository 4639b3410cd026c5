import type { Sheet } from './sheet.ts';

/** Structure types of ISO 32000 (table 333 on) that the record uses. */
export type StructureType =
  'Sect' | 'H1' | 'H2' | 'H3' | 'P' | 'L' | 'LI' | 'Table' | 'TR' | 'TH' | 'TD' | 'Note' | 'Figure';

/** Draws something as one element of the document's structure. Neither `tagged` nor `artifact` may be called within. */
export function tagged(sheet: Sheet, type: StructureType, draw: () => void, alt?: string): void {
  const element = sheet.pdf.struct(type, alt === undefined ? {} : { alt });
  sheet.parent.add(element);
  const content = sheet.pdf.markStructureContent(type);
  draw();
  sheet.pdf.endMarkedContent();
  element.add(content);
  element.end();
}

/** An element that holds what is tagged until it is closed. @returns what closes it */
export function openGroup(sheet: Sheet, type: StructureType): () => void {
  const outer = sheet.parent;
  const element = sheet.pdf.struct(type);
  outer.add(element);
  sheet.parent = element;
  return () => {
    sheet.parent = outer;
    element.end();
  };
}

/** An element that holds what is tagged within. */
export function group(sheet: Sheet, type: StructureType, draw: () => void): void {
  const close = openGroup(sheet, type);
  draw();
  close();
}

/** Rules, frames, feet and repeated heads: seen, but no part of what is read out. */
export function artifact(sheet: Sheet, type: 'Layout' | 'Pagination', draw: () => void): void {
  sheet.pdf.markContent('Artifact', { type });
  draw();
  sheet.pdf.endMarkedContent();
}

/** A horizontal rule over the width of the page. */
export function rule(sheet: Sheet, width: number, colour: string): void {
  artifact(sheet, 'Layout', () => {
    sheet.pdf
      .lineWidth(width)
      .strokeColor(colour)
      .moveTo(sheet.left, sheet.y)
      .lineTo(sheet.left + sheet.width, sheet.y)
      .stroke();
  });
}

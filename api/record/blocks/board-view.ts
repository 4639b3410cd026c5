import type { Board } from '#core/board/document.ts';
import { boundsOf } from '#core/geometry/polygon.ts';
import type { MmRing } from '#core/drawing/heat-bands.ts';
import type { LabelBox } from '#core/drawing/place-labels.ts';
import { ink, type Sheet } from '../sheet.ts';
import { widthOf, writeLine } from '../typeset.ts';

/** A board at a place on the page: millimetres (y up) to points (y down). */
export type BoardView = {
  left: number;
  top: number;
  width: number;
  height: number;
  pointsPerMm: number;
  x(mm: number): number;
  y(mm: number): number;
};

/** Size in points of a board fitted into a box. */
export function fitBoard(board: Board, width: number, height: number): { width: number; height: number } {
  const { minX, maxX, minY, maxY } = boundsOf(board.outline.points);
  const pointsPerMm = Math.min(width / (maxX - minX), height / (maxY - minY));
  return { width: (maxX - minX) * pointsPerMm, height: (maxY - minY) * pointsPerMm };
}

export function boardView(board: Board, left: number, top: number, size: { width: number; height: number }): BoardView {
  const { minX, maxX, maxY } = boundsOf(board.outline.points);
  const pointsPerMm = size.width / (maxX - minX);
  return {
    left,
    top,
    ...size,
    pointsPerMm,
    x: (mm) => left + (mm - minX) * pointsPerMm,
    y: (mm) => top + (maxY - mm) * pointsPerMm,
  };
}

/** Adds a closed ring to the current path. */
export function traceRing({ pdf }: Sheet, view: BoardView, ring: MmRing): void {
  ring.forEach(([px, py], index) =>
    index === 0 ? pdf.moveTo(view.x(px), view.y(py)) : pdf.lineTo(view.x(px), view.y(py)),
  );
  pdf.closePath();
}

export function clipToOutline(sheet: Sheet, view: BoardView, { outline }: Board): void {
  for (const ring of [outline.points, ...outline.cutouts]) traceRing(sheet, view, ring);
  sheet.pdf.clip('even-odd');
}

export function strokeOutline(sheet: Sheet, view: BoardView, { outline }: Board, width = 1): void {
  for (const ring of [outline.points, ...outline.cutouts]) traceRing(sheet, view, ring);
  sheet.pdf.lineWidth(width).strokeColor(ink).stroke();
}

/** Box of rings on the page. */
export function boxOnPage(view: BoardView, rings: readonly MmRing[]): LabelBox {
  const { minX, maxX, minY, maxY } = boundsOf(rings.flat());
  return {
    x: view.x(minX),
    y: view.y(maxY),
    width: (maxX - minX) * view.pointsPerMm,
    height: (maxY - minY) * view.pointsPerMm,
  };
}

/** Size of a text on its light plate. */
export function plateSize(sheet: Sheet, text: string, size: number): { width: number; height: number } {
  return { width: widthOf(sheet, text, { face: 'semibold', size }) + 4, height: size * 1.34 };
}

/** Text on a light plate, so that it reads over every band and every copper tone, in grey as well. */
export function drawPlate(sheet: Sheet, text: string, box: LabelBox, size: number): void {
  sheet.pdf.rect(box.x, box.y, box.width, box.height).fillOpacity(0.86).fill('#ffffff').fillOpacity(1);
  writeLine(sheet, text, box.x + 2, box.y + size * 0.06, box.width, { face: 'semibold', size });
}

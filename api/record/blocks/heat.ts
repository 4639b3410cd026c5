import { heatBands, type Isotherm, isotherms } from '#core/drawing/heat-bands.ts';
import { isothermLabels } from '#core/drawing/isotherm-label.ts';
import type { LabelBox } from '#core/drawing/place-labels.ts';
import { formatGiven, formatNumber } from '#core/format.ts';
import { polygonContains } from '#core/geometry/polygon.ts';
import type { RecordBlock, RecordHeat } from '#core/record/record-document.ts';
import type { BlockSetter } from '../block.ts';
import { ensure, type Sheet } from '../sheet.ts';
import { tagged } from '../structure.ts';
import { lineHeight, writeLine } from '../typeset.ts';
import {
  boardView,
  type BoardView,
  clipToOutline,
  drawPlate,
  fitBoard,
  plateSize,
  strokeOutline,
  traceRing,
} from './board-view.ts';
import { drawHeatScale, heatScaleWidth } from './heat-scale-bar.ts';
import { type DrawnParts, drawParts, drawVias } from './parts.ts';

const titleHeight = lineHeight(9.5) + 3;
const gap = 14;
/** Least height, so that the scale bar and its words have room beside a flat board. */
const lowest = 150;

/** The board with filled heat bands, labelled isotherms, the limits as isotherms, and the scale bar beside it. */
export const heatSetter: BlockSetter<Extract<RecordBlock, { kind: 'heat' }>> = {
  lead: (sheet, { drawing }) => titleHeight + heightOf(sheet, drawing),
  draw(sheet, { drawing }) {
    const height = heightOf(sheet, drawing);
    ensure(sheet, titleHeight + height);
    tagged(sheet, 'Figure', () => drawHeat(sheet, drawing, height), altOf(drawing));
    sheet.y += titleHeight + height + 12;
  },
};

function sizeOf(sheet: Sheet, { board }: RecordHeat) {
  const wide = fitBoard(board, sheet.width - heatScaleWidth - gap, 252);
  // A tall board may take most of a page, or it would be too narrow to read.
  return wide.width < 140 ? fitBoard(board, 200, 520) : wide;
}

const heightOf = (sheet: Sheet, drawing: RecordHeat) => Math.max(lowest, sizeOf(sheet, drawing).height);

function altOf({ condition, layer, coolestC, hottestC, junctions }: RecordHeat): string {
  const parts = junctions.map(({ ref, junctionC, verdict }) => `${ref} ${formatNumber(junctionC, 1)} °C ${verdict}`);
  return `Heat of layer ${layer} in condition ${condition}, from ${formatNumber(coolestC, 1)} to ${formatNumber(hottestC, 1)} °C. Junctions: ${parts.join(', ') || 'none'}.`;
}

function drawHeat(sheet: Sheet, drawing: RecordHeat, height: number) {
  const { board, condition, layer, side } = drawing;
  const size = sizeOf(sheet, drawing);
  writeLine(sheet, `${condition}: layer ${layer} (${side})`, sheet.left, sheet.y, sheet.width, {
    face: 'semibold',
    size: 9.5,
  });
  const view = boardView(board, sheet.left, sheet.y + titleHeight, size);
  drawBands(sheet, view, drawing);
  strokeOutline(sheet, view, board);
  const words = new Map(drawing.junctions.map(({ ref, junctionC }) => [ref, `${ref} ${formatNumber(junctionC, 1)}`]));
  const occupied = drawParts(sheet, view, board, { side, label: (ref) => words.get(ref) ?? ref, size: 7 });
  drawFigures(sheet, view, drawing, occupied);
  drawHeatScale(sheet, drawing, view.left + size.width + gap, view.top, height);
}

function drawBands(sheet: Sheet, view: BoardView, { board, field, layer, scale, limits }: RecordHeat) {
  const { pdf } = sheet;
  pdf.save();
  clipToOutline(sheet, view, board);
  for (const band of heatBands(field, layer, scale)) {
    for (const ring of band.polygons.flat()) traceRing(sheet, view, ring);
    pdf.fill(band.colour, 'even-odd');
  }
  pdf.lineWidth(0.35).strokeColor('#4a4038');
  for (const { rings } of isotherms(field, layer, scale.levels.slice(1))) {
    for (const ring of rings) traceRing(sheet, view, ring);
    pdf.stroke();
  }
  for (const pour of board.pours) {
    if (pour.layer !== layer) continue;
    for (const ring of [pour.points, ...pour.holes]) traceRing(sheet, view, ring);
    pdf.lineWidth(0.8).strokeColor('#5d2d13').stroke();
  }
  drawVias(sheet, view, board, layer);
  for (const { rings } of isotherms(
    field,
    layer,
    limits.map(({ valueC }) => valueC),
  )) {
    for (const [width, colour] of [
      [2.6, '#ffffff'],
      [1.3, '#000000'],
    ] as const) {
      for (const ring of rings) traceRing(sheet, view, ring);
      pdf.lineWidth(width).strokeColor(colour);
      if (colour === '#000000') pdf.dash(4, { space: 2 });
      pdf.stroke().undash();
    }
  }
  pdf.restore();
}

/** Temperatures at the isotherms, limits first, where neither a part nor its text stands. */
function drawFigures(sheet: Sheet, view: BoardView, drawing: RecordHeat, { texts, parts }: DrawnParts) {
  const { board, field, layer, scale, limits } = drawing;
  const size = 6.4;
  const onBoard = ([x, y]: Mm) =>
    isClear([view.x(x), view.y(y)], [], view) &&
    polygonContains(board.outline.points, x, y) &&
    !board.outline.cutouts.some((ring) => polygonContains(ring, x, y));
  const clearOf = (boxes: readonly LabelBox[]) => (point: Mm) =>
    onBoard(point) && isClear([view.x(point[0]), view.y(point[1])], boxes, view);
  const limitsC = limits.map(({ valueC }) => valueC);
  const levels = scale.levels.slice(1).filter((level) => !limitsC.includes(level));
  const limitLines = isotherms(field, layer, limitsC);
  const lines = [...limitLines, ...isotherms(field, layer, levels)];
  // A limit is named over a part if need be, but never over a text.
  const clearOfTexts = clearOf(texts);
  const overParts = (point: Mm, line: Isotherm) => limitLines.includes(line) && clearOfTexts(point);
  for (const { valueC, at } of isothermLabels(lines, clearOf([...texts, ...parts]), 28 / view.pointsPerMm, overParts)) {
    const text = limitsC.includes(valueC) ? `limit ${formatGiven(valueC)}` : formatGiven(valueC);
    const plate = plateSize(sheet, text, size);
    const x = view.x(at[0]) - plate.width / 2;
    drawPlate(sheet, text, { x, y: view.y(at[1]) - plate.height / 2, ...plate }, size);
  }
}

type Mm = readonly [number, number];

/** Whether a figure centred on a point of the page stays inside the drawing and off the boxes. */
function isClear([x, y]: readonly [number, number], boxes: readonly LabelBox[], view: BoardView): boolean {
  const [reachX, reachY] = [18, 6];
  const inside =
    x > view.left + reachX &&
    x < view.left + view.width - reachX &&
    y > view.top + reachY &&
    y < view.top + view.height - reachY;
  return (
    inside &&
    boxes.every(
      (box) =>
        x < box.x - reachX || x > box.x + box.width + reachX || y < box.y - reachY || y > box.y + box.height + reachY,
    )
  );
}

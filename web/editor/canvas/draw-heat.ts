import type { Board } from '#core/board/document.ts';
import { polygonContains } from '#core/geometry/polygon.ts';
import { formatGiven, formatQuantity } from '#core/format.ts';
import type { HeatBand, Isotherm } from '#core/drawing/heat-bands.ts';
import { isothermLabels } from '#core/drawing/isotherm-label.ts';
import { toScreen } from '../camera.ts';

import { boardRings } from './draw-board.ts';
import { type Sheet, drawText, strokePath, tracePath } from './sheet.ts';

type Mm = readonly [number, number];
type Outlined = Pick<Board, 'outline'>;

/** Bands, isotherms and limits of one layer in one condition, made once per field and scale. */
export type HeatPicture = {
  bands: readonly HeatBand[];
  lines: readonly Isotherm[];
  limits: readonly { label: string; line: Isotherm }[];
};

/** Filled bands, clipped to the board. */
export function drawBands(sheet: Sheet, board: Outlined, { bands }: HeatPicture): void {
  const { pen } = sheet;
  pen.save();
  tracePath(sheet, boardRings(board));
  pen.clip('evenodd');
  for (const band of bands) {
    for (const polygon of band.polygons) {
      tracePath(sheet, polygon);
      pen.fillStyle = band.colour;
      pen.fill('evenodd');
    }
  }
  pen.restore();
}

/** Isotherms as thin lines, the limits as heavy dashed ones. */
export function drawIsotherms(sheet: Sheet, board: Outlined, { lines, limits }: HeatPicture): void {
  const { pen } = sheet;
  pen.save();
  tracePath(sheet, boardRings(board));
  pen.clip('evenodd');
  pen.globalAlpha = 0.55;
  for (const line of lines) {
    tracePath(sheet, line.rings);
    strokePath(sheet, '#000000', 0.8);
  }
  pen.globalAlpha = 1;
  for (const { line } of limits) {
    tracePath(sheet, line.rings);
    strokePath(sheet, '#ffffff', 4.5);
    strokePath(sheet, '#000000', 2, [8, 4]);
  }
  pen.restore();
}

/**
 * Temperatures beside the isotherms, names beside the limits. A limit that parts leave no room for is named below the scale alone.
 * @param occupied where no figure may stand, because a part or its own figures do
 */
export function drawIsothermLabels(
  sheet: Sheet,
  board: Outlined,
  { lines, limits }: HeatPicture,
  occupied: (point: Mm) => boolean,
): void {
  const { camera, view } = sheet;
  const onBoard = (point: Mm) =>
    polygonContains(board.outline.points, ...point) &&
    !board.outline.cutouts.some((ring) => polygonContains(ring, ...point));
  const free = (point: Mm) => onBoard(point) && !occupied(point);
  const apartMm = 46 / camera.pxPerMm;
  const ordered = [...limits.map(({ line }) => line), ...lines];
  for (const { valueC, at } of isothermLabels(ordered, free, apartMm)) {
    const limit = limits.find(({ line }) => line.valueC === valueC);
    const text = limit ? `${limit.label} ${formatQuantity(valueC, '°C', 0)}` : formatGiven(valueC);
    drawText(sheet, text, toScreen(camera, view, at), {
      sizePx: 11,
      bold: Boolean(limit),
      colour: '#22201d',
      plate: 'rgb(253 251 247 / 0.88)',
    });
  }
}

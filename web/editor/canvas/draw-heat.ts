import type { Board } from '#core/board/document.ts';
import { formatGiven, formatQuantity } from '#core/format.ts';
import type { HeatBand, Isotherm } from '#web/heat/heat-bands.ts';
import { isothermLabels } from '#web/heat/isotherm-label.ts';
import { toScreen } from '../camera.ts';
import { contains } from '../footprint.ts';
import { boardRings } from './draw-board.ts';
import { type Sheet, drawText, strokePath, tracePath } from './sheet.ts';

/** Bands, isotherms and limits of one layer in one condition, made once per field and scale. */
export type HeatPicture = {
  bands: readonly HeatBand[];
  lines: readonly Isotherm[];
  limits: readonly { label: string; line: Isotherm }[];
};

/** Filled bands, clipped to the board. */
export function drawBands(sheet: Sheet, board: Pick<Board, 'outline'>, { bands }: HeatPicture): void {
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

/** Isotherms with their temperatures; the limits as heavy dashed lines with their names. */
export function drawIsotherms(sheet: Sheet, board: Pick<Board, 'outline'>, { lines, limits }: HeatPicture): void {
  const { pen, camera, view } = sheet;
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
  const inside = (point: readonly [number, number]) =>
    contains(board.outline.points, point) && !board.outline.cutouts.some((ring) => contains(ring, point));
  const apartMm = 46 / camera.pxPerMm;
  const named = limits.map(({ line }) => line);
  for (const { valueC, at } of isothermLabels([...named, ...lines], inside, apartMm)) {
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

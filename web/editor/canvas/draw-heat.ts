import type { Board } from '#core/board/document.ts';
import { polygonContains } from '#core/geometry/polygon.ts';
import { formatGiven, formatQuantity } from '#core/format.ts';
import type { HeatBand, Isotherm } from '#core/drawing/heat-bands.ts';
import { isothermLabels } from '#core/drawing/isotherm-label.ts';
import { leaderLine } from '#core/drawing/leader-line.ts';
import { type LabelBox, overlap, placeLabels } from '#core/drawing/place-labels.ts';
import { toScreen, type ViewSize } from '../camera.ts';

import { boardRings } from './draw-board.ts';
import { type Sheet, drawLeader, drawText, strokePath, textWidth, tracePath } from './sheet.ts';

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

const figurePx = 11;
const figureHeight = 16;
/** From a limit to its name where no room was left on the line itself, px. */
const nameGapPx = 14;

/**
 * Temperatures on the isotherms, names on the limits. The name of a limit that has no room on its line stands beside it
 * with a leader; an isotherm without room has no figure.
 * @param occupied what no figure may cover, px on the screen
 */
export function drawIsothermLabels(
  sheet: Sheet,
  board: Outlined,
  { lines, limits }: HeatPicture,
  occupied: readonly LabelBox[],
): void {
  const { camera, view } = sheet;
  const onBoard = (point: Mm) =>
    polygonContains(board.outline.points, ...point) &&
    !board.outline.cutouts.some((ring) => polygonContains(ring, ...point));
  const taken = [...occupied];
  const roomFor = (text: string, bold: boolean) => (point: Mm) => {
    const box = figureBox(sheet, text, point, bold);
    return onBoard(point) && isInView(box, view) && taken.every((other) => overlap(box, other) === 0);
  };
  for (const { label, line } of limits) {
    const text = `${label} ${formatQuantity(line.valueC, '°C', 0)}`;
    const [found] = isothermLabels([line], roomFor(text, true), 0);
    const box = found ? figureBox(sheet, text, found.at, true) : nameBeside(sheet, text, line, taken);
    if (!box) continue;
    taken.push(box);
    drawFigure(sheet, text, box, true);
  }
  const free = (point: Mm, { valueC }: Isotherm) => roomFor(formatGiven(valueC), false)(point);
  for (const { valueC, at } of isothermLabels(lines, free, 46 / camera.pxPerMm)) {
    const text = formatGiven(valueC);
    drawFigure(sheet, text, figureBox(sheet, text, at, false), false);
  }
}

/** Draws the leader and returns where the name goes; null where the limit is not in view. */
function nameBeside(sheet: Sheet, text: string, line: Isotherm, taken: readonly LabelBox[]): LabelBox | null {
  const { camera, view } = sheet;
  const shown = line.rings
    .flat()
    .map((point) => toScreen(camera, view, point))
    .filter(([x, y]) => x >= 0 && y >= 0 && x <= view.width && y <= view.height);
  // The end of the line that lies furthest down the board: plates stand above their parts.
  const foot = shown.reduce<Mm | null>((low, point) => (!low || point[1] > low[1] ? point : low), null);
  if (!foot) return null;
  const anchor = { x: foot[0], y: foot[1], width: 0, height: 0 };
  const width = textWidth(sheet, text, figurePx, true) + 8;
  const bounds = { x: 0, y: 0, width: view.width, height: view.height };
  const [box] = placeLabels([{ box: anchor, width, height: figureHeight }], bounds, taken, nameGapPx);
  if (!box) return null;
  const leader = leaderLine(anchor, box, 0);
  if (leader) drawLeader(sheet, leader);
  return box;
}

function figureBox(sheet: Sheet, text: string, at: Mm, bold: boolean): LabelBox {
  const [x, y] = toScreen(sheet.camera, sheet.view, at);
  const width = textWidth(sheet, text, figurePx, bold) + 8;
  return { x: x - width / 2, y: y - figureHeight / 2, width, height: figureHeight };
}

function isInView(box: LabelBox, view: ViewSize): boolean {
  return box.x >= 0 && box.y >= 0 && box.x + box.width <= view.width && box.y + box.height <= view.height;
}

function drawFigure(sheet: Sheet, text: string, box: LabelBox, bold: boolean): void {
  drawText(sheet, text, [box.x + box.width / 2, box.y + box.height / 2], {
    sizePx: figurePx,
    bold,
    colour: '#22201d',
    plate: 'rgb(253 251 247 / 0.88)',
  });
}

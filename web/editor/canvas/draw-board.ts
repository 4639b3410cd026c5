import type { Board } from '#core/board/document.ts';
import { bodyRing, landRings, rectangleRing } from '#core/board/footprint.ts';
import { toScreen } from '../camera.ts';
import { drawnGridStep } from '../grid.ts';
import { copperTone } from './palette.ts';
import { drawViaField } from './draw-via-field.ts';
import {
  type Sheet,
  drawText,
  fillRings,
  hatchRings,
  strokePath,
  strokeRings,
  strokeTwice,
  tracePath,
} from './sheet.ts';

/** Hatch of each copper layer by its place from the top, so that layers differ without colour. */
const hatchAngles = [45, -45, 0, 90, 22, -22];

type Outlined = Pick<Board, 'outline'>;
/** What the copper picture needs; a moved part changes nothing of it. */
export type CopperBoard = Pick<Board, 'outline' | 'stackup' | 'pours'>;

/** Table and laminate. */
export function drawLaminate(sheet: Sheet, board: Outlined): void {
  const { pen, view, palette } = sheet;
  pen.fillStyle = palette.table;
  pen.fillRect(0, 0, view.width, view.height);
  fillRings(sheet, boardRings(board), palette.laminate);
}

/** Edge of the board and of its cut-outs, over everything that is clipped to it. */
export function drawBoardEdge(sheet: Sheet, board: Outlined): void {
  const { palette } = sheet;
  strokeTwice(sheet, boardRings(board), palette.laminateEdge, 1.6);
  hatchRings(sheet, board.outline.cutouts, palette.inkSoft, 45, 7, 0.8);
}

export function boardRings(board: Outlined) {
  return [board.outline.points, ...board.outline.cutouts];
}

export function drawGrid(sheet: Sheet, board: Outlined, gridMm: number): void {
  const { pen, camera, view, palette } = sheet;
  const step = drawnGridStep(gridMm, camera.pxPerMm);
  pen.save();
  tracePath(sheet, boardRings(board));
  pen.clip('evenodd');
  const reach = [view.width / 2 / camera.pxPerMm, view.height / 2 / camera.pxPerMm] as const;
  for (const strong of [false, true]) {
    pen.beginPath();
    for (const axis of [0, 1] as const) {
      const first = Math.ceil((camera.centreMm[axis] - reach[axis]) / step);
      const last = Math.floor((camera.centreMm[axis] + reach[axis]) / step);
      for (let index = first; index <= last; index++) {
        if ((index % 10 === 0) !== strong) continue;
        const [x, y] = toScreen(camera, view, [index * step, index * step]);
        const place = Math.round(axis === 0 ? x : y) + 0.5;
        pen.moveTo(axis === 0 ? place : 0, axis === 0 ? 0 : place);
        pen.lineTo(axis === 0 ? place : view.width, axis === 0 ? view.height : place);
      }
    }
    strokePath(sheet, strong ? palette.gridStrong : palette.grid, 1);
  }
  pen.restore();
}

/**
 * Planes, traces and pours of every layer, the active one last and strongest.
 * @param overHeat draws copper as outline and hatch only, so that the heat below stays readable
 */
export function drawCopper(sheet: Sheet, board: CopperBoard, activeLayer: string, overHeat: boolean): void {
  const { pen } = sheet;
  pen.save();
  tracePath(sheet, boardRings(board));
  pen.clip('evenodd');
  const layers = board.stackup.copper.map((layer, index) => ({ layer, index }));
  const inactive = layers.filter(({ layer }) => layer.name !== activeLayer).toReversed();
  const active = layers.filter(({ layer }) => layer.name === activeLayer);
  for (const { layer, index } of inactive) drawLayer(sheet, board, layer.name, index, false, overHeat);
  for (const { layer, index } of active) drawLayer(sheet, board, layer.name, index, true, overHeat);
  pen.restore();
}

function drawLayer(
  sheet: Sheet,
  board: CopperBoard,
  layerName: string,
  index: number,
  isActive: boolean,
  overHeat: boolean,
): void {
  const { pen, palette } = sheet;
  const count = board.stackup.copper.length;
  const layer = board.stackup.copper[index];
  const tone = overHeat ? '#2a1a10' : copperTone(palette, index, count);
  const angle = hatchAngles[index % hatchAngles.length] ?? 45;
  if (isActive && layer?.plane) {
    pen.globalAlpha = overHeat ? 0.22 : 0.5;
    hatchRings(sheet, boardRings(board), tone, angle, 12, overHeat ? 1 : 2.2);
  }
  if (isActive && layer?.traces) {
    pen.globalAlpha = 0.3;
    hatchRings(sheet, boardRings(board), tone, 0, 9, 0.8);
  }
  for (const pour of board.pours) {
    if (pour.layer !== layerName) continue;
    const rings = [pour.points, ...pour.holes];
    if (isActive && !overHeat) {
      pen.globalAlpha = 0.35 + 0.5 * pour.coverage;
      fillRings(sheet, rings, tone);
    }
    pen.globalAlpha = isActive ? (overHeat ? 0.3 : 0.5) : overHeat ? 0.14 : 0.4;
    hatchRings(sheet, rings, isActive && !overHeat ? palette.halo : tone, angle, isActive ? 8 : 10, isActive ? 1 : 0.8);
    pen.globalAlpha = isActive ? 1 : overHeat ? 0.4 : 0.7;
    strokeRings(sheet, rings, tone, isActive ? 1.6 : 1, isActive ? [] : [5, 4]);
  }
  pen.globalAlpha = 1;
}

/** Lands of every part, via fields, sinks. */
export function drawLands(sheet: Sheet, board: Board, overHeat: boolean): void {
  const { palette, pen } = sheet;
  for (const regulator of board.regulators) {
    const rings = landRings(board, regulator).map((land) => land.ring);
    pen.globalAlpha = overHeat ? 0.75 : 1;
    for (const ring of rings) fillRings(sheet, [ring], palette.land);
    pen.globalAlpha = 1;
    strokeRings(sheet, rings, palette.halo, 0.8);
  }
  for (const field of board.viaFields) drawViaField(sheet, field);
  for (const sink of board.sinks) {
    const ring = rectangleRing(sink.at, sink.sizeMm, 0);
    hatchRings(sheet, [ring], palette.ink, 90, 4, 1);
    strokeTwice(sheet, [ring], palette.ink, 1.4);
    label(sheet, sink.id, sink.at);
  }
}

/** Bodies with their references, heat sources, probes. */
export function drawBodies(sheet: Sheet, board: Board): void {
  const { pen, palette, camera, view } = sheet;
  for (const regulator of board.regulators) {
    const ring = bodyRing(board, regulator);
    if (!ring) continue;
    const below = regulator.side === 'bottom';
    if (!below) fillRings(sheet, [ring], palette.body);
    strokeTwice(sheet, [ring], below ? palette.ink : palette.bodyEdge, 1.2, below ? [4, 3] : []);
    const mark = ring[0];
    if (mark) dot(sheet, mark, 2.5, palette.accent);
  }
  for (const source of board.sources) {
    const ring = rectangleRing(source.at, source.bodyMm ?? source.sizeMm, source.rotationDeg);
    if (source.bodyMm) strokeRings(sheet, [ring], palette.ink, 1);
    const heated = rectangleRing(source.at, source.sizeMm, source.rotationDeg);
    pen.globalAlpha = 0.85;
    hatchRings(sheet, [heated], palette.ink, 45, 5, 1.1);
    hatchRings(sheet, [heated], palette.ink, -45, 5, 1.1);
    pen.globalAlpha = 1;
    strokeTwice(sheet, [heated], palette.ink, 1.3, source.side === 'bottom' ? [4, 3] : []);
    label(sheet, source.ref, source.at);
  }
  for (const probe of board.probes) {
    const [x, y] = toScreen(camera, view, probe.at);
    for (const [colour, width] of [
      [palette.halo, 4],
      [palette.ink, 1.5],
    ] as const) {
      pen.beginPath();
      pen.arc(x, y, 5, 0, 2 * Math.PI);
      pen.moveTo(x - 9, y);
      pen.lineTo(x + 9, y);
      pen.moveTo(x, y - 9);
      pen.lineTo(x, y + 9);
      strokePath(sheet, colour, width);
    }
    drawText(sheet, probe.id, [x + 12, y - 9], { sizePx: 11, align: 'left' });
  }
}

function label(sheet: Sheet, text: string, at: readonly [number, number]): void {
  drawText(sheet, text, toScreen(sheet.camera, sheet.view, at), { sizePx: 11, bold: true, plate: sheet.palette.panel });
}

function dot(sheet: Sheet, at: readonly [number, number], radiusPx: number, colour: string): void {
  const [x, y] = toScreen(sheet.camera, sheet.view, at);
  sheet.pen.beginPath();
  sheet.pen.arc(x, y, radiusPx, 0, 2 * Math.PI);
  sheet.pen.fillStyle = colour;
  sheet.pen.fill();
}

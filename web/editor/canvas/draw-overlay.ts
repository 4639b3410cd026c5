import type { Board } from '#core/board/document.ts';
import type { Point } from '#core/board/outline.ts';
import { formatQuantity } from '#core/format.ts';
import { toScreen } from '../camera.ts';
import { rectangleRing, rectangleBetween } from '#core/board/footprint.ts';
import type { ObjectKey } from '#core/board/object-key.ts';
import { boxOf, cornersOf, objectRings } from '#core/board/object-rings.ts';
import type { Gesture } from '../tools/gesture.ts';
import { type Sheet, drawText, strokePath, strokeRings, strokeTwice } from './sheet.ts';

/** Frames of what is selected, handles on the corners of a single polygon. */
export function drawSelection(sheet: Sheet, board: Board, selection: readonly ObjectKey[]): void {
  for (const key of selection) {
    const rings = objectRings(board, key);
    const corners = cornersOf(board, key);
    if (corners) strokeTwice(sheet, rings, sheet.palette.ink, 2.2);
    else {
      const box = boxOf(rings);
      if (!box) continue;
      const pad = 4 / sheet.camera.pxPerMm;
      const frame = rectangleBetween([box.left - pad, box.bottom - pad], [box.right + pad, box.top + pad]);
      strokeTwice(sheet, [frame], sheet.palette.ink, 2);
    }
    if (corners && selection.length === 1) for (const corner of corners) drawHandle(sheet, corner);
  }
}

function drawHandle({ pen, camera, view, palette }: Sheet, at: Point): void {
  const [x, y] = toScreen(camera, view, at);
  pen.fillStyle = palette.panel;
  pen.strokeStyle = palette.accent;
  pen.lineWidth = 2;
  pen.beginPath();
  pen.rect(x - 5, y - 5, 10, 10);
  pen.fill();
  pen.stroke();
}

/** The shape that is being drawn, with its size in figures. */
export function drawGesture(sheet: Sheet, gesture: Gesture): void {
  const { palette, camera, view } = sheet;
  if (gesture.phase === 'marquee') {
    strokeTwice(sheet, [rectangleBetween(gesture.from, gesture.to)], palette.ink, 1.2, [4, 3]);
  }
  if (gesture.phase === 'rectangle') {
    const { from, to } = gesture;
    strokeTwice(sheet, [rectangleBetween(from, to)], palette.ink, 2);
    const size = `${figure(Math.abs(to[0] - from[0]))} × ${formatQuantity(Math.abs(to[1] - from[1]), 'mm')}`;
    readout(sheet, size, to);
  }
  if (gesture.phase === 'polygon') {
    const points = [...gesture.points, gesture.to];
    openLine(sheet, points);
    for (const point of gesture.points) drawHandle(sheet, point);
    const last = gesture.points.at(-1);
    if (last) {
      const [dx, dy] = [gesture.to[0] - last[0], gesture.to[1] - last[1]];
      readout(sheet, `${formatQuantity(Math.hypot(dx, dy), 'mm')} (${figure(dx)}, ${figure(dy)})`, gesture.to);
    }
  }
  if (gesture.phase === 'moving') {
    const to: Point = [gesture.from[0] + gesture.by[0], gesture.from[1] + gesture.by[1]];
    readout(sheet, `by ${figure(gesture.by[0])}, ${formatQuantity(gesture.by[1], 'mm')}`, to);
    const [x, y] = toScreen(camera, view, gesture.from);
    const [x2, y2] = toScreen(camera, view, to);
    sheet.pen.beginPath();
    sheet.pen.moveTo(x, y);
    sheet.pen.lineTo(x2, y2);
    strokePath(sheet, palette.ink, 1, [3, 3]);
  }
  if (gesture.phase === 'moving-corner') {
    readout(sheet, `${figure(gesture.to[0])}, ${formatQuantity(gesture.to[1], 'mm')}`, gesture.to);
  }
}

/** Outline of a part that is about to be placed. */
export function drawGhost(sheet: Sheet, at: Point, sizeMm: readonly number[]): void {
  strokeTwice(sheet, [rectangleRing(at, sizeMm, 0)], sheet.palette.ink, 1.6, [4, 3]);
}

/** Cross at the place that Enter would use, with its coordinates. */
export function drawCrosshair(sheet: Sheet, at: Point): void {
  const { pen, camera, view, palette } = sheet;
  const [x, y] = toScreen(camera, view, at);
  for (const [colour, width] of [
    [palette.halo, 4],
    [palette.ink, 1.6],
  ] as const) {
    pen.beginPath();
    pen.moveTo(x - 18, y);
    pen.lineTo(x + 18, y);
    pen.moveTo(x, y - 18);
    pen.lineTo(x, y + 18);
    strokePath(sheet, colour, width);
  }
  readout(sheet, `${figure(at[0])}, ${formatQuantity(at[1], 'mm')}`, at);
}

function openLine(sheet: Sheet, points: readonly Point[]): void {
  const { pen, camera, view, palette } = sheet;
  for (const [colour, width] of [
    [palette.halo, 4.5],
    [palette.ink, 2],
  ] as const) {
    pen.beginPath();
    points.forEach((point, index) => {
      const [x, y] = toScreen(camera, view, point);
      if (index === 0) pen.moveTo(x, y);
      else pen.lineTo(x, y);
    });
    strokePath(sheet, colour, width);
  }
  const first = points[0];
  const last = points.at(-1);
  if (points.length > 2 && first && last) strokeRings(sheet, [[last, first]], palette.ink, 1, [3, 4]);
}

function readout(sheet: Sheet, text: string, at: Point): void {
  const [x, y] = toScreen(sheet.camera, sheet.view, at);
  drawText(sheet, text, [x + 16, y - 16], { align: 'left', plate: sheet.palette.panel, bold: true });
}

function figure(value: number): string {
  return formatQuantity(value, 'mm').replace(/\s?mm$/, '');
}

import type { Board } from '#core/board/document.ts';
import type { Point } from '#core/board/outline.ts';
import { formatQuantity } from '#core/format.ts';
import { toScreen } from '../camera.ts';
import { guideLines } from '../snap/guide-lines.ts';
import { neighbourGaps } from '../snap/neighbour-gaps.ts';
import { linesOf, snapLines } from '../snap/snap-lines.ts';
import type { Gesture } from '../tools/gesture.ts';
import { type Sheet, drawText, strokePath } from './sheet.ts';

/** Guides run on past the objects that they join by this, px. */
const overhangPx = 10;

/** While something is moved: lines that it shares with other objects, and its clear distances to the next ones. */
export function drawAlignment(sheet: Sheet, board: Board, gesture: Gesture): void {
  if (gesture.phase === 'moving-corner') {
    const [x, y] = gesture.to;
    const own = [
      { axis: 0 as const, at: x, low: y, high: y, key: gesture.key },
      { axis: 1 as const, at: y, low: x, high: x, key: gesture.key },
    ];
    for (const guide of guideLines(own, snapLines(board, [gesture.key]))) drawGuide(sheet, guide);
  }
  if (gesture.phase !== 'moving') return;
  const own = gesture.keys.flatMap((key) => linesOf(board, key));
  for (const guide of guideLines(own, snapLines(board, gesture.keys))) drawGuide(sheet, guide);
  for (const gap of neighbourGaps(board, gesture.keys)) {
    drawLine(sheet, gap.from, gap.to, 0, []);
    const middle: Point = [(gap.from[0] + gap.to[0]) / 2, (gap.from[1] + gap.to[1]) / 2];
    const [x, y] = toScreen(sheet.camera, sheet.view, middle);
    drawText(sheet, formatQuantity(gap.mm, 'mm'), [x, y], { align: 'center', plate: sheet.palette.panel });
  }
}

function drawGuide(sheet: Sheet, { axis, at, from, to }: ReturnType<typeof guideLines>[number]): void {
  const point = (along: number): Point => (axis === 0 ? [at, along] : [along, at]);
  drawLine(sheet, point(from), point(to), overhangPx / sheet.camera.pxPerMm, [6, 3]);
}

/** A line readable over any heat band: ink on a halo. */
function drawLine(sheet: Sheet, from: Point, to: Point, overhangMm: number, dash: number[]): void {
  const { pen, camera, view, palette } = sheet;
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]) || 1;
  const [ux, uy] = [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
  const [x1, y1] = toScreen(camera, view, [from[0] - ux * overhangMm, from[1] - uy * overhangMm]);
  const [x2, y2] = toScreen(camera, view, [to[0] + ux * overhangMm, to[1] + uy * overhangMm]);
  for (const [colour, width, pattern] of [
    [palette.halo, 3.5, []],
    [palette.accent, 1.4, dash],
  ] as const) {
    pen.beginPath();
    pen.moveTo(x1, y1);
    pen.lineTo(x2, y2);
    strokePath(sheet, colour, width, [...pattern]);
  }
}

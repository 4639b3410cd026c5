import type { Board } from '#core/board/document.ts';
import { formatQuantity } from '#core/format.ts';
import type { Verdict } from '#core/result/result.ts';
import { toScreen } from '../camera.ts';
import { bodyRing } from '#core/board/footprint.ts';
import { boxOf } from '#core/board/object-rings.ts';
import { type Sheet, strokePath } from './sheet.ts';

/** What stands beside a part on the canvas. */
export type PartMark = { ref: string; temperatureC: number | null; verdict: Verdict };

const sizePx = 13;
const shapePx = 12;

/** Where bodies and their plates stand, with a little room around them. */
export function occupiedBy(sheet: Sheet, board: Board): (point: readonly [number, number]) => boolean {
  const px = 1 / sheet.camera.pxPerMm;
  const boxes = [
    ...board.regulators.flatMap((regulator) => {
      const box = boxOf([bodyRing(board, regulator) ?? [regulator.at]]);
      if (!box) return [];
      const middle = (box.left + box.right) / 2;
      const half = Math.max((box.right - box.left) / 2 + 20 * px, 80 * px);
      return [{ left: middle - half, right: middle + half, bottom: box.bottom - 14 * px, top: box.top + 36 * px }];
    }),
    ...[...board.sources, ...board.sinks].flatMap(({ at, sizeMm }) => {
      const reach = Math.max(...sizeMm) / 2 + 20 * px;
      const [x, y] = at;
      return [{ left: x - reach, right: x + reach, bottom: y - reach, top: y + reach }];
    }),
  ];
  return ([x, y]) => boxes.some((box) => x >= box.left && x <= box.right && y >= box.bottom && y <= box.top);
}

/** Reference, junction temperature and verdict shape of every regulator on a plate above its body. */
export function drawMarks(sheet: Sheet, board: Board, marks: ReadonlyMap<string, PartMark>, isPreview: boolean): void {
  const { pen, palette, camera, view } = sheet;
  for (const regulator of board.regulators) {
    const mark = marks.get(regulator.ref);
    const box = boxOf([bodyRing(board, regulator) ?? [regulator.at]]);
    if (!box) continue;
    const [x, top] = toScreen(camera, view, [(box.left + box.right) / 2, box.top]);
    const temperature = mark ? ` ${formatQuantity(mark.temperatureC, '°C')}` : '';
    pen.font = `600 ${sizePx}px 'Source Sans 3', sans-serif`;
    const refWidth = pen.measureText(regulator.ref).width;
    const width = refWidth + pen.measureText(temperature).width + (mark ? shapePx + 6 : 0) + 12;
    const y = top - 17;
    pen.fillStyle = palette.panel;
    pen.beginPath();
    pen.rect(x - width / 2, y - 10, width, 20);
    pen.fill();
    strokePath(sheet, palette.ink, 1, isPreview ? [3, 2] : []);
    let left = x - width / 2 + 6;
    if (mark) {
      drawVerdict(sheet, mark.verdict, [left + shapePx / 2, y], shapePx / 2);
      left += shapePx + 5;
    }
    pen.textAlign = 'left';
    pen.textBaseline = 'middle';
    pen.fillStyle = palette.ink;
    pen.fillText(regulator.ref, left, y + 1);
    pen.font = `${sizePx}px 'Source Sans 3', sans-serif`;
    pen.fillText(temperature, left + refWidth, y + 1);
  }
}

/** The shapes of the verdict marks: disc, half disc, triangle, ring. */
function drawVerdict({ pen, palette }: Sheet, verdict: Verdict, [x, y]: readonly [number, number], r: number): void {
  pen.fillStyle = palette.verdict[verdict];
  pen.strokeStyle = palette.verdict[verdict];
  pen.lineWidth = 1.5;
  pen.beginPath();
  if (verdict === 'over') {
    pen.moveTo(x, y - r);
    pen.lineTo(x + r, y + r * 0.85);
    pen.lineTo(x - r, y + r * 0.85);
    pen.closePath();
    pen.fill();
    return;
  }
  if (verdict === 'within') {
    pen.arc(x, y, r - 0.5, 0, 2 * Math.PI);
    pen.fill();
    return;
  }
  pen.arc(x, y, r - 1, 0, 2 * Math.PI);
  pen.stroke();
  if (verdict === 'close') {
    pen.beginPath();
    pen.arc(x, y, r - 0.5, 0, Math.PI);
    pen.fill();
  }
}

import { leaderLine } from '#core/drawing/leader-line.ts';
import type { Verdict } from '#core/result/result.ts';
import { type Plate, plateGapPx, plateShapePx, plateTextPx } from './place-plates.ts';
import { drawLeader, type Sheet, strokePath, textFont } from './sheet.ts';

/** Reference, junction temperature and verdict shape of every regulator on its plate, with a line to the part where it stands apart. */
export function drawMarks(sheet: Sheet, plates: readonly Plate[], isPreview: boolean): void {
  for (const { footprint, place } of plates) {
    const leader = leaderLine(footprint, place, plateGapPx * 1.5);
    if (leader) drawLeader(sheet, leader);
  }
  for (const plate of plates) drawPlate(sheet, plate, isPreview);
}

function drawPlate(sheet: Sheet, plate: Plate, isPreview: boolean): void {
  const { pen, palette } = sheet;
  const { x, y, width, height } = plate.place;
  pen.fillStyle = palette.panel;
  pen.beginPath();
  pen.rect(x, y, width, height);
  pen.fill();
  strokePath(sheet, palette.ink, 1, isPreview ? [3, 2] : []);
  const middle = y + height / 2;
  let left = x + 6;
  if (plate.mark) {
    drawVerdict(sheet, plate.mark.verdict, [left + plateShapePx / 2, middle], plateShapePx / 2);
    left += plateShapePx + 5;
  }
  pen.textAlign = 'left';
  pen.textBaseline = 'middle';
  pen.fillStyle = palette.ink;
  pen.font = textFont(plateTextPx, true);
  pen.fillText(plate.ref, left, middle + 1);
  pen.font = textFont(plateTextPx);
  pen.fillText(plate.temperature, left + plate.refWidth, middle + 1);
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

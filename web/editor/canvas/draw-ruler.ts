import { formatGiven } from '#core/format.ts';
import { toBoard, toScreen } from '../camera.ts';
import { rulerStep } from '../grid.ts';
import { type Sheet, strokePath } from './sheet.ts';

export const rulerPx = 22;

/** Rulers in mm along the upper and the left edge, with a mark at the pointer. */
export function drawRulers(sheet: Sheet, pointer: readonly [number, number] | null): void {
  const { pen, view, palette } = sheet;
  pen.fillStyle = palette.panel;
  pen.fillRect(0, 0, view.width, rulerPx);
  pen.fillRect(0, 0, rulerPx, view.height);
  drawScale(sheet, 0);
  drawScale(sheet, 1);
  if (pointer) {
    const [x, y] = toScreen(sheet.camera, view, pointer);
    pen.fillStyle = palette.accent;
    pen.fillRect(x - 0.75, 0, 1.5, rulerPx);
    pen.fillRect(0, y - 0.75, rulerPx, 1.5);
  }
  pen.fillStyle = palette.panel;
  pen.fillRect(0, 0, rulerPx, rulerPx);
  pen.font = "10px 'Source Sans 3', sans-serif";
  pen.fillStyle = palette.inkSoft;
  pen.textAlign = 'center';
  pen.textBaseline = 'middle';
  pen.fillText('mm', rulerPx / 2, rulerPx / 2 + 1);
  pen.beginPath();
  pen.moveTo(0, rulerPx - 0.5);
  pen.lineTo(view.width, rulerPx - 0.5);
  pen.moveTo(rulerPx - 0.5, 0);
  pen.lineTo(rulerPx - 0.5, view.height);
  strokePath(sheet, palette.gridStrong, 1);
}

function drawScale(sheet: Sheet, axis: 0 | 1): void {
  const { pen, camera, view, palette } = sheet;
  const step = rulerStep(camera.pxPerMm);
  const small = step / 5;
  const from = toBoard(camera, view, [0, view.height])[axis];
  const to = toBoard(camera, view, [view.width, 0])[axis];
  pen.beginPath();
  pen.font = "10px 'Source Sans 3', sans-serif";
  pen.fillStyle = palette.ink;
  for (let index = Math.ceil(from / small); index * small <= to; index++) {
    const [x, y] = toScreen(camera, view, [index * small, index * small]);
    const place = Math.round(axis === 0 ? x : y) + 0.5;
    const isMain = index % 5 === 0;
    const length = isMain ? 8 : 4;
    pen.moveTo(axis === 0 ? place : rulerPx, axis === 0 ? rulerPx : place);
    pen.lineTo(axis === 0 ? place : rulerPx - length, axis === 0 ? rulerPx - length : place);
    if (!isMain) continue;
    const text = formatGiven(Number((index * small).toPrecision(8)));
    pen.textBaseline = 'middle';
    if (axis === 0) {
      pen.textAlign = 'center';
      pen.fillText(text, place, 7);
    } else {
      pen.save();
      pen.translate(7, place);
      pen.rotate(-Math.PI / 2);
      pen.textAlign = 'center';
      pen.fillText(text, 0, 0);
      pen.restore();
    }
  }
  strokePath(sheet, palette.inkSoft, 0.8);
}

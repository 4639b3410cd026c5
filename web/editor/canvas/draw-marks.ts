import type { Board } from '#core/board/document.ts';
import { type LabelBox, placeLabels } from '#core/drawing/place-labels.ts';
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

const plateHeight = 20;
const plateGap = 7;

type Plate = {
  mark: PartMark | undefined;
  ref: string;
  temperature: string;
  refWidth: number;
  body: LabelBox;
  width: number;
};

/** Reference, junction temperature and verdict shape of every regulator on a plate beside its body; plates keep clear of each other. */
export function drawMarks(sheet: Sheet, board: Board, marks: ReadonlyMap<string, PartMark>, isPreview: boolean): void {
  const { view } = sheet;
  const plates = board.regulators.map((regulator): Plate => plateOf(sheet, board, regulator, marks.get(regulator.ref)));
  const sources = board.sources.map(({ at, sizeMm }) =>
    screenBox(sheet, [
      [at[0] - sizeMm[0] / 2, at[1] - sizeMm[1] / 2],
      [at[0] + sizeMm[0] / 2, at[1] + sizeMm[1] / 2],
    ]),
  );
  const places = placeLabels(
    plates.map(({ body, width }) => ({ box: body, width, height: plateHeight })),
    { x: 0, y: 0, width: view.width, height: view.height },
    [...plates.map(({ body }) => body), ...sources],
    plateGap,
  );
  plates.forEach((plate, index) => {
    const place = places[index];
    if (place) drawPlate(sheet, plate, place, isPreview);
  });
}

function plateOf(
  sheet: Sheet,
  board: Board,
  regulator: Board['regulators'][number],
  mark: PartMark | undefined,
): Plate {
  const { pen } = sheet;
  const temperature = mark ? ` ${formatQuantity(mark.temperatureC, '°C')}` : '';
  pen.font = `600 ${sizePx}px 'Source Sans 3', sans-serif`;
  const refWidth = pen.measureText(regulator.ref).width;
  const width = refWidth + pen.measureText(temperature).width + (mark ? shapePx + 6 : 0) + 12;
  const body = screenBox(sheet, bodyRing(board, regulator) ?? [regulator.at]);
  return { mark, ref: regulator.ref, temperature, refWidth, body, width };
}

function screenBox({ camera, view }: Sheet, points: readonly (readonly [number, number])[]): LabelBox {
  const shown = points.map((point) => toScreen(camera, view, point));
  const [xs, ys] = [shown.map(([x]) => x), shown.map(([, y]) => y)];
  const [x, y] = [Math.min(...xs), Math.min(...ys)];
  return { x, y, width: Math.max(...xs) - x, height: Math.max(...ys) - y };
}

function drawPlate(sheet: Sheet, plate: Plate, { x, y, width }: LabelBox, isPreview: boolean): void {
  const { pen, palette } = sheet;
  pen.fillStyle = palette.panel;
  pen.beginPath();
  pen.rect(x, y, width, plateHeight);
  pen.fill();
  strokePath(sheet, palette.ink, 1, isPreview ? [3, 2] : []);
  const middle = y + plateHeight / 2;
  let left = x + 6;
  if (plate.mark) {
    drawVerdict(sheet, plate.mark.verdict, [left + shapePx / 2, middle], shapePx / 2);
    left += shapePx + 5;
  }
  pen.textAlign = 'left';
  pen.textBaseline = 'middle';
  pen.fillStyle = palette.ink;
  pen.font = `600 ${sizePx}px 'Source Sans 3', sans-serif`;
  pen.fillText(plate.ref, left, middle + 1);
  pen.font = `${sizePx}px 'Source Sans 3', sans-serif`;
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

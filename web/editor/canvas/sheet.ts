import { type Camera, type ViewSize, toScreen } from '../camera.ts';
import type { Palette } from './palette.ts';

/** What a picture is drawn on: the pen, what it shows, and the colours of the theme. */
export type Sheet = { pen: CanvasRenderingContext2D; camera: Camera; view: ViewSize; palette: Palette };
type Mm = readonly [number, number];

/** Adds closed rings in mm to a new path. */
export function tracePath({ pen, camera, view }: Sheet, rings: readonly (readonly Mm[])[]): void {
  pen.beginPath();
  for (const ring of rings) {
    ring.forEach((point, index) => {
      const [x, y] = toScreen(camera, view, point);
      if (index === 0) pen.moveTo(x, y);
      else pen.lineTo(x, y);
    });
    pen.closePath();
  }
}

export function fillRings(sheet: Sheet, rings: readonly (readonly Mm[])[], colour: string): void {
  tracePath(sheet, rings);
  sheet.pen.fillStyle = colour;
  sheet.pen.fill('evenodd');
}

export function strokeRings(
  sheet: Sheet,
  rings: readonly (readonly Mm[])[],
  colour: string,
  widthPx: number,
  dash: readonly number[] = [],
): void {
  tracePath(sheet, rings);
  strokePath(sheet, colour, widthPx, dash);
}

export function strokePath({ pen }: Sheet, colour: string, widthPx: number, dash: readonly number[] = []): void {
  pen.setLineDash([...dash]);
  pen.strokeStyle = colour;
  pen.lineWidth = widthPx;
  pen.stroke();
  pen.setLineDash([]);
}

/** A line that shows on every ground: a wide one in the second tone, the line itself over it. */
export function strokeTwice(
  sheet: Sheet,
  rings: readonly (readonly Mm[])[],
  colour: string,
  widthPx: number,
  dash: readonly number[] = [],
): void {
  strokeRings(sheet, rings, sheet.palette.halo, widthPx + 2.5);
  strokeRings(sheet, rings, colour, widthPx, dash);
}

/** Lines across the rings at an angle, `apartPx` apart; they stay in place on the board while it is moved. */
export function hatchRings(
  sheet: Sheet,
  rings: readonly (readonly Mm[])[],
  colour: string,
  angleDeg: number,
  apartPx: number,
  widthPx = 1,
): void {
  const { pen, camera, view } = sheet;
  pen.save();
  tracePath(sheet, rings);
  pen.clip('evenodd');
  const box = screenBox(sheet, rings);
  const angle = (-angleDeg * Math.PI) / 180;
  const [dx, dy] = [Math.cos(angle), Math.sin(angle)];
  const origin = toScreen(camera, view, [0, 0]);
  const corners: Mm[] = [
    [box.left, box.top],
    [box.right, box.top],
    [box.right, box.bottom],
    [box.left, box.bottom],
  ];
  const across = corners.map(([x, y]) => (x - origin[0]) * -dy + (y - origin[1]) * dx);
  const along = corners.map(([x, y]) => (x - origin[0]) * dx + (y - origin[1]) * dy);
  const [from, to] = [Math.min(...along), Math.max(...along)];
  pen.beginPath();
  for (let step = Math.ceil(Math.min(...across) / apartPx); step * apartPx <= Math.max(...across); step++) {
    const offset = step * apartPx;
    pen.moveTo(origin[0] + from * dx - offset * dy, origin[1] + from * dy + offset * dx);
    pen.lineTo(origin[0] + to * dx - offset * dy, origin[1] + to * dy + offset * dx);
  }
  strokePath(sheet, colour, widthPx);
  pen.restore();
}

/** Box of the rings on the screen, cut to what can be seen. */
function screenBox({ camera, view }: Sheet, rings: readonly (readonly Mm[])[]) {
  const points = rings.flat().map((point) => toScreen(camera, view, point));
  const xs = points.map((point) => point[0]);
  const ys = points.map((point) => point[1]);
  return {
    left: Math.max(0, Math.min(...xs)),
    right: Math.min(view.width, Math.max(...xs)),
    top: Math.max(0, Math.min(...ys)),
    bottom: Math.min(view.height, Math.max(...ys)),
  };
}

/** Line from a label to what it names, both on the screen. */
export function drawLeader(sheet: Sheet, [from, to]: readonly [Mm, Mm]): void {
  const { pen, palette } = sheet;
  for (const [colour, width] of [
    [palette.halo, 3.5],
    [palette.ink, 1],
  ] as const) {
    pen.beginPath();
    pen.moveTo(...from);
    pen.lineTo(...to);
    strokePath(sheet, colour, width);
  }
}

export function textFont(sizePx: number, bold = false): string {
  return `${bold ? '600 ' : ''}${sizePx}px 'Source Sans 3', sans-serif`;
}

/** Width of a text on the screen, px. */
export function textWidth({ pen }: Sheet, text: string, sizePx: number, bold = false): number {
  pen.font = textFont(sizePx, bold);
  return pen.measureText(text).width;
}

export type TextLook = { sizePx?: number; bold?: boolean; colour?: string; plate?: string; align?: CanvasTextAlign };

/** Text with a plate (or a halo) behind it; `[x, y]` is its middle line on the screen. */
export function drawText(sheet: Sheet, text: string, [x, y]: Mm, look: TextLook = {}): void {
  const { pen, palette } = sheet;
  const { sizePx = 12, bold = false, colour = palette.ink, plate, align = 'center' } = look;
  pen.font = textFont(sizePx, bold);
  pen.textAlign = align;
  pen.textBaseline = 'middle';
  if (plate) {
    const width = pen.measureText(text).width + 8;
    const left = align === 'center' ? x - width / 2 : x - 4;
    pen.fillStyle = plate;
    pen.fillRect(left, y - sizePx * 0.72, width, sizePx * 1.44);
  } else {
    pen.strokeStyle = palette.halo;
    pen.lineWidth = 3;
    pen.lineJoin = 'round';
    pen.strokeText(text, x, y);
  }
  pen.fillStyle = colour;
  pen.fillText(text, x, y + 0.5);
}

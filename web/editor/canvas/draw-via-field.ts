import type { ViaField } from '#core/board/copper.ts';
import { toScreen } from '../camera.ts';
import { pitchOf, viaFieldRing } from '#core/board/footprint.ts';
import { type Sheet, hatchRings, strokePath, strokeTwice } from './sheet.ts';

/** Holes smaller than this on the screen are drawn as a dotted field instead, px. */
const smallestPx = 1.2;

/** Every hole as a ring, or the field as a hatched frame where the holes are too small to see. */
export function drawViaField(sheet: Sheet, field: ViaField): void {
  const { pen, camera, view, palette } = sheet;
  const frame = viaFieldRing(field);
  const radiusPx = (field.drillMm / 2) * camera.pxPerMm;
  if (radiusPx < smallestPx) {
    hatchRings(sheet, [frame], palette.ink, 45, 3, 0.7);
  } else {
    const angle = (field.rotationDeg * Math.PI) / 180;
    const [px, py] = pitchOf(field);
    pen.beginPath();
    for (let row = 0; row < field.rows; row++) {
      for (let column = 0; column < field.columns; column++) {
        const dx = (column - (field.columns - 1) / 2) * px;
        const dy = (row - (field.rows - 1) / 2) * py;
        const [x, y] = toScreen(camera, view, [
          field.at[0] + dx * Math.cos(angle) - dy * Math.sin(angle),
          field.at[1] + dx * Math.sin(angle) + dy * Math.cos(angle),
        ]);
        pen.moveTo(x + radiusPx, y);
        pen.arc(x, y, radiusPx, 0, 2 * Math.PI);
      }
    }
    pen.fillStyle = field.filling === 'copper' ? palette.land : palette.laminate;
    pen.fill();
    strokePath(sheet, palette.ink, 1.2);
  }
  strokeTwice(sheet, [frame], palette.inkSoft, 0.8, [2, 2]);
}

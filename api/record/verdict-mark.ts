import type { Verdict } from '#core/result/result.ts';
import { ink, type Sheet } from './sheet.ts';

/** Shape of a verdict, readable in grey: full disc, half disc, triangle, ring. */
export function drawVerdict({ pdf }: Sheet, verdict: Verdict, x: number, y: number, size = 6.5) {
  const r = size / 2;
  const [cx, cy] = [x + r, y + r];
  pdf.save().lineWidth(0.9).strokeColor(ink).fillColor(ink);
  if (verdict === 'within') pdf.circle(cx, cy, r).fill();
  else if (verdict === 'close') {
    pdf.circle(cx, cy, r - 0.4).stroke();
    pdf.path(`M ${cx} ${cy - r} A ${r} ${r} 0 0 0 ${cx} ${cy + r} Z`).fill();
  } else if (verdict === 'over') pdf.polygon([cx, cy - r], [cx + r, cy + r], [cx - r, cy + r]).fill();
  else pdf.circle(cx, cy, r - 0.4).stroke();
  pdf.restore();
}

import { formatNumber } from '#core/format.ts';
import type { RecordLadder } from '#core/record/record-document.ts';
import { ensure, ink, inkSoft, write, type Sheet } from '../sheet.ts';
import { drawVerdict } from '../verdict-mark.ts';

const steps = [
  ['box', 'Box', '#f3ece4'],
  ['air', 'Preheated air', '#e6d8c8'],
  ['neighbours', 'Neighbours', '#d3b79b'],
  ['board', 'Board', '#b98c66'],
  ['package', 'Package', '#8f5c38'],
] as const;

const barHeight = 13;
const rowHeight = 47;

/** One bar a junction on a common scale: the outside ambient at its foot, the rises side by side, limit and band at its end. */
export function drawLadders(sheet: Sheet, ladders: readonly RecordLadder[]) {
  const low = Math.min(...ladders.map((ladder) => ladder.ambientC));
  const high = Math.max(
    ...ladders.map((ladder) => Math.max(ladder.junctionC + ladder.uncertaintyK, ladder.limitC ?? 0)),
  );
  const left = sheet.left + 96;
  const width = sheet.width - 96 - 6;
  const at = (valueC: number) => left + ((valueC - low) / Math.max(1, high - low)) * width;
  ensure(sheet, rowHeight + 20);
  legend(sheet);
  for (const ladder of ladders) {
    if (ensure(sheet, rowHeight)) legend(sheet);
    drawLadder(sheet, ladder, at);
    sheet.y += rowHeight;
  }
  sheet.y += 4;
}

function legend(sheet: Sheet) {
  let x = sheet.left;
  for (const [, word, tone] of steps) {
    sheet.pdf
      .lineWidth(0.5)
      .rect(x, sheet.y + 2, 9, 7)
      .fillAndStroke(tone, ink);
    write(sheet, word, x + 13, sheet.y, { width: 80, size: 8, single: true });
    x += 28 + sheet.pdf.widthOfString(word);
  }
  write(sheet, 'dashed: limit · whisker: uncertainty', x, sheet.y, {
    width: 200,
    size: 8,
    colour: inkSoft,
    single: true,
  });
  sheet.y += 17;
}

function drawLadder(sheet: Sheet, ladder: RecordLadder, at: (valueC: number) => number) {
  const { pdf } = sheet;
  const top = sheet.y + 11;
  drawVerdict(sheet, ladder.verdict, sheet.left, sheet.y + 2.5);
  write(sheet, `${ladder.ref}  ${ladder.verdict}`, sheet.left + 11, sheet.y, {
    width: 84,
    font: 'semibold',
    size: 8.6,
    single: true,
  });
  write(sheet, ladder.condition, sheet.left, sheet.y + 12, { width: 88, size: 7.2, colour: inkSoft });
  let from = ladder.ambientC;
  const parts: string[] = [];
  for (const [key, word, tone] of steps) {
    const rise = ladder.steps[key];
    if (Math.abs(rise) >= 0.05) parts.push(`${word.toLowerCase()} ${formatNumber(rise, 1)}`);
    if (rise > 0.02)
      pdf
        .lineWidth(0.5)
        .rect(at(from), top, Math.max(0.3, at(from + rise) - at(from)), barHeight)
        .fillAndStroke(tone, ink);
    from += rise;
  }
  const middle = top + barHeight / 2;
  pdf.lineWidth(0.8).strokeColor(ink);
  const [a, b] = [at(ladder.junctionC - ladder.uncertaintyK), at(ladder.junctionC + ladder.uncertaintyK)];
  pdf
    .moveTo(a, middle)
    .lineTo(b, middle)
    .moveTo(a, middle - 3)
    .lineTo(a, middle + 3)
    .moveTo(b, middle - 3)
    .lineTo(b, middle + 3)
    .stroke();
  if (ladder.limitC !== null) {
    const x = at(ladder.limitC);
    pdf
      .lineWidth(1)
      .dash(3, { space: 2 })
      .moveTo(x, top - 5)
      .lineTo(x, top + barHeight + 5)
      .stroke()
      .undash();
  }
  write(sheet, `${formatNumber(ladder.ambientC, 1)} °C`, at(ladder.ambientC), sheet.y, {
    width: 60,
    size: 7.2,
    colour: inkSoft,
    single: true,
  });
  const words = `${parts.join(' + ')} K = junction ${formatNumber(ladder.junctionC, 1)} ± ${formatNumber(ladder.uncertaintyK, 1)} °C${ladder.limitC === null ? '' : `, limit ${formatNumber(ladder.limitC, 1)} °C`}`;
  write(sheet, words, sheet.left + 96, top + barHeight + 5, { width: sheet.width - 96, size: 7.6, single: true });
}

import { scaleLinear } from 'd3-scale';
import { formatGiven, formatNumber } from '#core/format.ts';
import type { RecordBlock, RecordLadder } from '#core/record/record-document.ts';
import type { BlockSetter } from '../block.ts';
import { ensure, ink, inkSoft, line, type Sheet } from '../sheet.ts';
import { tagged } from '../structure.ts';
import { widthOf, writeLine } from '../typeset.ts';
import { drawVerdict } from '../verdict-mark.ts';

const rungs = [
  ['box', 'Box', '#f6f0e8'],
  ['air', 'Preheated air', '#e3d3c1'],
  ['neighbours', 'Neighbours', '#cba982'],
  ['board', 'Board', '#a87448'],
  ['package', 'Package', '#6d3f22'],
] as const;

const labelWidth = 104;
const barHeight = 12;
const rowHeight = 38;
const headHeight = 36;

type Axis = { at(valueC: number): number; ticks: readonly number[] };

/** One bar a junction, all on one axis: the outside ambient at its foot, the rises one after another, band and limit. */
export const laddersSetter: BlockSetter<Extract<RecordBlock, { kind: 'ladders' }>> = {
  lead: () => headHeight + rowHeight,
  draw(sheet, { ladders }) {
    const axis = axisOf(sheet, ladders);
    ensure(sheet, headHeight + rowHeight);
    ladders.forEach((ladder, index) => {
      const broken = ensure(sheet, rowHeight);
      if (index === 0 || broken) drawAxis(sheet, axis);
      tagged(
        sheet,
        'Figure',
        () => drawLadder(sheet, ladder, axis),
        `Rise ladder of ${ladder.ref}: ${wordsOf(ladder)}`,
      );
      sheet.y += rowHeight;
    });
    sheet.y += 6;
  },
};

function axisOf(sheet: Sheet, ladders: readonly RecordLadder[]): Axis {
  const low = Math.min(...ladders.map(({ ambientC }) => ambientC));
  const high = Math.max(
    ...ladders.map(({ junctionC, uncertaintyK, limitC }) => Math.max(junctionC + uncertaintyK, limitC ?? -Infinity)),
  );
  const left = sheet.left + labelWidth;
  const scale = scaleLinear([low, Math.max(high, low + 5)], [left, sheet.left + sheet.width - 12]).nice(8);
  return { at: (valueC) => scale(valueC), ticks: scale.ticks(8) };
}

function drawAxis(sheet: Sheet, axis: Axis) {
  tagged(
    sheet,
    'Figure',
    () => {
      let x = sheet.left;
      for (const [, word, tone] of rungs) {
        sheet.pdf
          .lineWidth(0.5)
          .rect(x, sheet.y + 2, 9, 7)
          .fillAndStroke(tone, ink);
        writeLine(sheet, word, x + 13, sheet.y, 80, { size: 8 });
        x += 27 + widthOf(sheet, word, { size: 8 });
      }
      writeLine(sheet, 'dashed line: limit  ·  whisker: ±', x, sheet.y, 150, { size: 8, colour: inkSoft });
      for (const tick of axis.ticks)
        writeLine(sheet, formatGiven(tick), axis.at(tick) - 15, sheet.y + 17, 30, {
          size: 7.4,
          colour: inkSoft,
          align: 'center',
        });
      writeLine(sheet, '°C', sheet.left + labelWidth - 34, sheet.y + 17, 16, { size: 7.4, colour: inkSoft });
    },
    'Legend of the rise ladders and their axis in °C',
  );
  sheet.y += headHeight - 6;
}

function drawLadder(sheet: Sheet, ladder: RecordLadder, axis: Axis) {
  const { ticks } = axis;
  const at = (valueC: number) => axis.at(valueC);
  const { pdf } = sheet;
  const top = sheet.y + 6;
  pdf.lineWidth(0.4).strokeColor(line);
  for (const tick of ticks)
    pdf
      .moveTo(at(tick), sheet.y)
      .lineTo(at(tick), top + barHeight + 3)
      .stroke();
  drawVerdict(sheet, ladder.verdict, sheet.left, sheet.y + 3.5);
  writeLine(sheet, `${ladder.ref}  ${ladder.verdict}`, sheet.left + 11, sheet.y + 1, labelWidth - 20, {
    face: 'semibold',
    size: 8.4,
  });
  writeLine(sheet, ladder.condition, sheet.left, sheet.y + 13, labelWidth - 10, { size: 7.2, colour: inkSoft });
  let from = ladder.ambientC;
  for (const [key, , tone] of rungs) {
    const to = from + ladder.steps[key];
    if (to > from + 0.02)
      pdf
        .lineWidth(0.5)
        .rect(at(from), top, at(to) - at(from), barHeight)
        .fillAndStroke(tone, ink);
    from = to;
  }
  drawWhisker(sheet, at(ladder.junctionC - ladder.uncertaintyK), at(ladder.junctionC + ladder.uncertaintyK), top);
  if (ladder.limitC !== null) {
    const x = at(ladder.limitC);
    pdf
      .lineWidth(1.3)
      .strokeColor(ink)
      .dash(3, { space: 2 })
      .moveTo(x, top - 5)
      .lineTo(x, top + barHeight + 5)
      .stroke()
      .undash();
  }
  writeLine(sheet, wordsOf(ladder), sheet.left + labelWidth, top + barHeight + 4, sheet.width - labelWidth, {
    size: 7.4,
  });
}

/** Band of a junction; a light line under the dark one shows it on every tone. */
function drawWhisker({ pdf }: Sheet, a: number, b: number, top: number) {
  const middle = top + barHeight / 2;
  for (const [width, colour] of [
    [2.2, '#ffffff'],
    [0.9, ink],
  ] as const) {
    pdf.lineWidth(width).strokeColor(colour);
    pdf.moveTo(a, middle).lineTo(b, middle);
    for (const x of [a, b]) pdf.moveTo(x, middle - 3).lineTo(x, middle + 3);
    pdf.stroke();
  }
}

function wordsOf({ ambientC, steps, junctionC, uncertaintyK, limitC }: RecordLadder): string {
  const rises = rungs
    .filter(([key]) => Math.abs(steps[key]) >= 0.05)
    .map(([key, word]) => `${word.toLowerCase()} ${formatNumber(steps[key], 1)}`);
  const sum = [`ambient ${formatNumber(ambientC, 1)} °C`, ...rises].join(' + ');
  const limit = limitC === null ? 'no limit' : `limit ${formatNumber(limitC, 1)} °C`;
  return `${sum} = junction ${formatNumber(junctionC, 1)} ± ${formatNumber(uncertaintyK, 1)} °C, ${limit}`;
}

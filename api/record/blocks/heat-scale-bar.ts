import { bandColour } from '#core/drawing/heat-scale.ts';
import { formatGiven, formatNumber } from '#core/format.ts';
import type { RecordHeat } from '#core/record/record-document.ts';
import { ink, inkSoft, type Sheet } from '../sheet.ts';
import { lineHeight, linesOf, writeLine, writeLines } from '../typeset.ts';

/** Room for the bar, its figures and the words beside it, points. */
export const heatScaleWidth = 132;
const barWidth = 13;
const size = 7.2;

/** Upright scale bar in °C, hot at the top, with the limits as dashed marks and what they belong to. */
export function drawHeatScale(sheet: Sheet, drawing: RecordHeat, left: number, top: number, height: number) {
  const { pdf } = sheet;
  const { scale } = drawing;
  const words = linesOf(sheet, wordsOf(drawing), heatScaleWidth, { size });
  const barTop = top + 14;
  const barHeight = height - 14 - words.length * lineHeight(size) - 10;
  const at = (valueC: number) => barTop + barHeight * (1 - (valueC - scale.minC) / (scale.maxC - scale.minC));
  writeLine(sheet, '°C', left, top, 30, { size, face: 'semibold' });
  scale.levels.forEach((level, index) => {
    const upper = scale.levels[index + 1] ?? scale.maxC;
    pdf.rect(left, at(upper), barWidth, at(level) - at(upper) + 0.2).fill(bandColour(scale, index));
  });
  pdf.lineWidth(0.6).strokeColor(ink).rect(left, barTop, barWidth, barHeight).stroke();
  const borders = [...scale.levels, scale.maxC];
  const every = Math.max(1, Math.ceil((borders.length * 9) / barHeight));
  borders.forEach((border, index) => {
    pdf
      .lineWidth(0.5)
      .strokeColor(ink)
      .moveTo(left + barWidth, at(border))
      .lineTo(left + barWidth + 2.5, at(border))
      .stroke();
    if (index % every === 0)
      writeLine(sheet, formatGiven(border), left + barWidth + 4, at(border) - size * 0.62, 24, { size });
  });
  let above = Infinity;
  for (const { label, valueC } of onScale(drawing)) {
    pdf
      .lineWidth(1.3)
      .dash(3, { space: 1.6 })
      .moveTo(left - 4, at(valueC))
      .lineTo(left + barWidth, at(valueC))
      .stroke()
      .undash();
    // Words of limits that lie close together are pushed apart, upwards.
    above = Math.min(above - lineHeight(size), at(valueC) - size * 0.62);
    const text = `limit ${formatGiven(valueC)}: ${label}`;
    writeLine(sheet, text, left + barWidth + 24, above, heatScaleWidth - barWidth - 24, { size });
  }
  writeLines(sheet, words, left, barTop + barHeight + 7, heatScaleWidth, { size, colour: inkSoft });
}

const onScale = ({ scale, limits }: RecordHeat) => limits.filter(({ valueC }) => valueC <= scale.maxC);

function wordsOf(drawing: RecordHeat): string {
  const { coolestC, hottestC, airC, limits } = drawing;
  const lines = [
    `Surface ${formatNumber(coolestC, 1)} to ${formatNumber(hottestC, 1)} °C, air ${formatNumber(airC, 1)} °C.`,
  ];
  const shown = onScale(drawing);
  const missed = shown.filter(({ reached }) => !reached).map(({ valueC }) => formatGiven(valueC));
  if (missed.length > 0) lines.push(`Not reached here: ${missed.join(', ')} °C.`);
  const beyond = limits.filter((limit) => !shown.includes(limit));
  if (beyond.length > 0)
    lines.push(
      `Above the scale: ${beyond.map(({ label, valueC }) => `limit ${formatGiven(valueC)}, ${label}`).join('; ')}.`,
    );
  return lines.join('\n');
}

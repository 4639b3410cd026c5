import type { Board } from '#core/board/document.ts';
import { bodyRing, landRings, rectangleRing } from '#core/board/footprint.ts';
import { heatBands, isotherms, type MmRing } from '#core/drawing/heat-bands.ts';
import { bandColour, heatScale, type HeatScale } from '#core/drawing/heat-scale.ts';
import { isothermLabels } from '#core/drawing/isotherm-label.ts';
import { formatGiven, formatNumber, formatQuantity } from '#core/format.ts';
import { boundsOf, polygonContains } from '#core/geometry/polygon.ts';
import type { RecordDrawing } from '#core/record/record-document.ts';
import { viaCentres } from '#core/thermal/via-conductance.ts';
import { ensure, ink, inkSoft, write, type Sheet } from '../sheet.ts';

/** Two drawings fit on a page. */
const tallest = 240;

/** Board with filled heat bands, labelled isotherms, the limits as isotherms, copper and parts over them, and the scale bar. */
export function drawBoard(sheet: Sheet, drawing: RecordDrawing) {
  const { board, field, layer } = drawing;
  const { pdf } = sheet;
  const box = boundsOf(board.outline.points);
  const mm = Math.min(sheet.width / (box.maxX - box.minX), tallest / (box.maxY - box.minY));
  const height = (box.maxY - box.minY) * mm;
  ensure(sheet, height + 74);
  write(sheet, drawing.condition, sheet.left, sheet.y, {
    width: sheet.width,
    font: 'semibold',
    size: 10,
    single: true,
  });
  sheet.y += 15;
  const left = sheet.left + (sheet.width - (box.maxX - box.minX) * mm) / 2;
  const top = sheet.y;
  const x = (value: number) => left + (value - box.minX) * mm;
  const y = (value: number) => top + (box.maxY - value) * mm;
  const ring = (points: MmRing) => {
    points.forEach(([px, py], index) => (index === 0 ? pdf.moveTo(x(px), y(py)) : pdf.lineTo(x(px), y(py))));
    pdf.closePath();
  };

  const values = (field.layers.find(({ name }) => name === layer)?.temperatureC ?? new Float32Array()).filter((value) =>
    Number.isFinite(value),
  );
  const hottest = values.reduce((most, value) => Math.max(most, value), drawing.airC);
  const coolest = values.reduce((least, value) => Math.min(least, value), hottest);
  const scale = heatScale(drawing.airC, hottest);
  pdf.save();
  for (const points of [board.outline.points, ...board.outline.cutouts]) ring(points);
  pdf.clip('even-odd');
  for (const band of heatBands(field, layer, scale)) {
    for (const polygon of band.polygons) for (const points of polygon) ring(points);
    pdf.fill(band.colour, 'even-odd');
  }
  const lines = isotherms(field, layer, scale.levels.slice(1));
  pdf.lineWidth(0.35).strokeColor('#4a4038');
  for (const line of lines) {
    for (const points of line.rings) ring(points);
    pdf.stroke();
  }
  const limits = drawing.limits.map((limit) => ({ ...limit, lines: isotherms(field, layer, [limit.valueC]) }));
  for (const limit of limits) {
    for (const line of limit.lines) {
      for (const points of line.rings) ring(points);
      pdf.lineWidth(2.4).strokeColor('#ffffff').stroke();
      for (const points of line.rings) ring(points);
      pdf.lineWidth(1.2).strokeColor('#000000').dash(4, { space: 2 }).stroke().undash();
    }
  }
  drawCopper(sheet, board, layer, ring);
  pdf.restore();
  for (const points of [board.outline.points, ...board.outline.cutouts]) ring(points);
  pdf.lineWidth(1.1).strokeColor(ink).stroke();
  drawParts(sheet, board, drawing, ring, x, y);
  const onBoard = ([px, py]: readonly [number, number]) =>
    px > box.minX + 8 / mm &&
    px < box.maxX - 8 / mm &&
    py > box.minY + 5 / mm &&
    py < box.maxY - 5 / mm &&
    polygonContains(board.outline.points, px, py);
  for (const label of isothermLabels(lines, onBoard, 26 / mm)) {
    plate(sheet, formatGiven(label.valueC), x(label.at[0]), y(label.at[1]), 6.4);
  }
  sheet.y = top + height + 8;
  drawScale(sheet, scale, drawing, layer, coolest, hottest);
}

function drawCopper({ pdf }: Sheet, board: Board, layer: string, ring: (points: MmRing) => void) {
  for (const pour of board.pours) {
    for (const points of [pour.points, ...pour.holes]) ring(points);
    pdf.lineWidth(pour.layer === layer ? 0.9 : 0.5).strokeColor('#6b3417');
    if (pour.layer !== layer) pdf.dash(2, { space: 1.6 });
    pdf.stroke().undash();
  }
}

function drawParts(
  sheet: Sheet,
  board: Board,
  drawing: RecordDrawing,
  ring: (points: MmRing) => void,
  x: (value: number) => number,
  y: (value: number) => number,
) {
  const { pdf } = sheet;
  const mm = x(1) - x(0);
  for (const via of board.viaFields) {
    for (const [vx, vy] of viaCentres(via))
      pdf
        .circle(x(vx), y(vy), Math.max(0.5, (via.drillMm / 2) * mm))
        .lineWidth(0.4)
        .strokeColor(ink)
        .stroke();
  }
  for (const regulator of board.regulators) {
    for (const land of landRings(board, regulator)) {
      ring(land.ring);
      pdf.lineWidth(0.5).strokeColor(ink).stroke();
    }
    const body = bodyRing(board, regulator);
    if (body) {
      ring(body);
      pdf.lineWidth(0.9).strokeColor(ink).stroke();
    }
    const found = drawing.junctions.find(({ ref }) => ref === regulator.ref);
    plate(
      sheet,
      found ? `${regulator.ref} ${formatNumber(found.junctionC, 1)} ${found.verdict}` : regulator.ref,
      x(regulator.at[0]),
      y(regulator.at[1]),
      7.4,
    );
  }
  for (const source of board.sources) {
    ring(rectangleRing(source.at, source.sizeMm, source.rotationDeg));
    pdf.lineWidth(0.7).strokeColor(ink).stroke();
    plate(sheet, source.ref, x(source.at[0]), y(source.at[1]), 6.8);
  }
  for (const probe of board.probes) {
    const [px, py] = [x(probe.at[0]), y(probe.at[1])];
    pdf
      .lineWidth(0.6)
      .strokeColor(ink)
      .moveTo(px - 3, py)
      .lineTo(px + 3, py)
      .moveTo(px, py - 3)
      .lineTo(px, py + 3)
      .stroke();
  }
}

/** Text on a light plate, so that it reads over every band, in grey as well. */
function plate(sheet: Sheet, text: string, cx: number, cy: number, size: number) {
  const { pdf } = sheet;
  const width = pdf.font('semibold').fontSize(size).widthOfString(text) + 4;
  const x = Math.min(Math.max(cx - width / 2, sheet.left), sheet.left + sheet.width - width);
  pdf
    .rect(x, cy - size * 0.68, width, size * 1.36)
    .fillOpacity(0.86)
    .fill('#ffffff')
    .fillOpacity(1);
  write(sheet, text, x + 2, cy - size * 0.66, { width: width + 4, font: 'semibold', size, single: true });
}

function drawScale(
  sheet: Sheet,
  scale: HeatScale,
  drawing: RecordDrawing,
  layer: string,
  coolest: number,
  hottest: number,
) {
  const { pdf } = sheet;
  const width = Math.min(sheet.width, 420);
  const left = sheet.left + (sheet.width - width) / 2;
  const at = (valueC: number) => left + ((valueC - scale.minC) / (scale.maxC - scale.minC)) * width;
  scale.levels.forEach((level, index) =>
    pdf.rect(at(level), sheet.y, width / scale.levels.length + 0.2, 9).fill(bandColour(scale, index)),
  );
  pdf.lineWidth(0.6).strokeColor(ink).rect(left, sheet.y, width, 9).stroke();
  const borders = [...scale.levels, scale.maxC];
  const every = borders.length > 10 ? 2 : 1;
  borders.forEach((border, index) => {
    pdf
      .lineWidth(0.5)
      .strokeColor(ink)
      .moveTo(at(border), sheet.y + 9)
      .lineTo(at(border), sheet.y + 11)
      .stroke();
    if (index % every === 0)
      write(sheet, formatGiven(border), at(border) - 15, sheet.y + 11, { width: 30, size: 7, align: 'center' });
  });
  sheet.y += 22;
  const words = [
    `Layer ${layer}, °C: coolest ${formatNumber(coolest, 1)}, hottest ${formatNumber(hottest, 1)}, air ${formatQuantity(drawing.airC, '°C')}.`,
    drawing.limits.length > 0 &&
      `Dashed isotherms: ${drawing.limits.map(({ label, valueC }) => `${label} ${formatGiven(valueC)} °C`).join('; ')}.`,
    'Solid lines: copper of this layer; dashed lines: pours of other layers.',
  ].filter(Boolean);
  const text = words.join(' ');
  write(sheet, text, sheet.left, sheet.y, { width: sheet.width, size: 7.6, colour: inkSoft });
  sheet.y += pdf.heightOfString(text, { width: sheet.width, lineGap: 1 }) + 12;
}

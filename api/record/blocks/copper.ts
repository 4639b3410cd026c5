import type { Board } from '#core/board/document.ts';
import { landRings, rectangleRing } from '#core/board/footprint.ts';
import { hatchLines } from '#core/drawing/hatch-lines.ts';
import type { MmRing } from '#core/drawing/heat-bands.ts';
import { placeLabels } from '#core/drawing/place-labels.ts';
import { formatGiven } from '#core/format.ts';
import type { RecordBlock } from '#core/record/record-document.ts';
import type { BlockSetter } from '../block.ts';
import { copper as copperInk, ensure, ink, type Sheet } from '../sheet.ts';
import { tagged } from '../structure.ts';
import { lineHeight, writeLine } from '../typeset.ts';
import {
  boardView,
  type BoardView,
  boxOnPage,
  clipToOutline,
  drawPlate,
  fitBoard,
  plateSize,
  strokeOutline,
  traceRing,
} from './board-view.ts';
import { drawParts, drawVias } from './parts.ts';

const gap = 16;
const tallest = 160;
const titleHeight = lineHeight(8.4) + 3;
const labelSize = 6.6;

/** Placement first, then the copper of every layer, two drawings beside each other. */
export const copperSetter: BlockSetter<Extract<RecordBlock, { kind: 'copper' }>> = {
  lead: (sheet, { board }) => sizeOf(sheet, board).height + titleHeight,
  draw(sheet, { board }) {
    const size = sizeOf(sheet, board);
    const drawings = drawingsOf(board);
    for (let first = 0; first < drawings.length; first += 2) {
      ensure(sheet, titleHeight + size.height);
      drawings.slice(first, first + 2).forEach((drawing, column) => {
        const left = sheet.left + column * ((sheet.width + gap) / 2);
        tagged(
          sheet,
          'Figure',
          () => {
            writeLine(sheet, drawing.title, left, sheet.y, (sheet.width - gap) / 2, { face: 'semibold', size: 8.4 });
            drawing.draw(sheet, boardView(board, left, sheet.y + titleHeight, size));
          },
          drawing.title,
        );
      });
      sheet.y += titleHeight + size.height + 8;
    }
  },
};

const sizeOf = (sheet: Sheet, board: Board) => fitBoard(board, (sheet.width - gap) / 2, tallest);

type Drawing = { title: string; draw(sheet: Sheet, view: BoardView): void };

function drawingsOf(board: Board): Drawing[] {
  return [
    {
      title: 'Placement (bottom parts dashed, probes as crosses)',
      draw(sheet, view) {
        strokeOutline(sheet, view, board);
        drawSinks(sheet, view, board);
        drawParts(sheet, view, board, { side: 'top', label: (ref) => ref, size: labelSize });
      },
    },
    ...board.stackup.copper.map((layer, index): Drawing => {
      const place = index === 0 ? ' (top)' : index === board.stackup.copper.length - 1 ? ' (bottom)' : '';
      return {
        title: `Layer ${layer.name}${place}, ${formatGiven(layer.thicknessUm, 'µm')}`,
        draw: (sheet, view) => drawLayer(sheet, view, board, index),
      };
    }),
  ];
}

const tones = { solid: '#dcb193', hatch: '#a4633c', land: '#7c4222' };

function drawLayer(sheet: Sheet, view: BoardView, board: Board, index: number) {
  const layer = board.stackup.copper[index];
  if (!layer) return;
  const { pdf } = sheet;
  const pours = board.pours.filter((pour) => pour.layer === layer.name);
  const names: { text: string; rings: readonly MmRing[] }[] = [];
  pdf.save();
  clipToOutline(sheet, view, board);
  if (layer.traces) hatch(sheet, view, 7, 135);
  if (layer.plane) {
    if (layer.plane.coverage >= 1) pdf.rect(view.left, view.top, view.width, view.height).fill(tones.solid);
    else hatch(sheet, view, 3, 45);
    // The clear rim of the plane: a stroke of twice the inset, half of it outside the outline.
    for (const ring of [board.outline.points, ...board.outline.cutouts]) traceRing(sheet, view, ring);
    pdf
      .lineWidth(2 * layer.plane.insetMm * view.pointsPerMm)
      .strokeColor('#ffffff')
      .stroke();
  }
  for (const pour of pours) {
    const rings = [pour.points, ...pour.holes];
    if (layer.plane || layer.traces) {
      for (const ring of rings) traceRing(sheet, view, ring);
      pdf.fill('#ffffff', 'even-odd');
    }
    pdf.save();
    for (const ring of rings) traceRing(sheet, view, ring);
    if (pour.coverage >= 1) pdf.fill(tones.solid, 'even-odd');
    else {
      pdf.clip('even-odd');
      hatch(sheet, view, 3, 45);
    }
    pdf.restore();
    for (const ring of rings) traceRing(sheet, view, ring);
    pdf.lineWidth(0.6).strokeColor(copperInk).stroke();
    names.push({ text: pour.net, rings: [pour.points] });
  }
  drawLands(sheet, view, board, index);
  drawVias(sheet, view, board, layer.name);
  pdf.restore();
  strokeOutline(sheet, view, board);
  nameNets(sheet, view, board, names, layer.plane);
}

/** Lands of the parts on this face; inner layers have none. */
function drawLands(sheet: Sheet, view: BoardView, board: Board, index: number) {
  const last = board.stackup.copper.length - 1;
  for (const regulator of board.regulators) {
    if (index !== (regulator.side === 'top' ? 0 : last)) continue;
    for (const { ring } of landRings(board, regulator)) traceRing(sheet, view, ring);
    sheet.pdf.lineWidth(0.4).fillAndStroke(tones.land, ink);
  }
}

function drawSinks(sheet: Sheet, view: BoardView, board: Board) {
  for (const sink of board.sinks) {
    traceRing(sheet, view, rectangleRing(sink.at, sink.sizeMm, 0));
    sheet.pdf.lineWidth(0.7).dash(4, { space: 1.5 }).strokeColor(ink).stroke().undash();
    const text = sink.id;
    const plate = plateSize(sheet, text, labelSize);
    const box = boxOnPage(view, [rectangleRing(sink.at, sink.sizeMm, 0)]);
    const [place] = placeLabels([{ box, ...plate }], boundsOf(view), [box]);
    if (place) drawPlate(sheet, text, place, labelSize);
  }
}

function nameNets(
  sheet: Sheet,
  view: BoardView,
  board: Board,
  names: readonly { text: string; rings: readonly MmRing[] }[],
  plane: Board['stackup']['copper'][number]['plane'],
) {
  const anchors = names.map(({ text, rings }) => {
    const box = boxOnPage(view, rings);
    // A net is named on its copper where there is room, beside it where there is not.
    const plate = plateSize(sheet, text, labelSize);
    const roomy = box.width > plate.width + 4 && box.height > plate.height + 4;
    const spot = { x: box.x + box.width / 2, y: box.y + 2 + plate.height, width: 0, height: 0 };
    return { text, box: roomy ? spot : box, ...plate };
  });
  if (plane) {
    const text = plane.coverage < 1 ? `${plane.net}, coverage ${formatGiven(plane.coverage)}` : plane.net;
    const corner = { x: view.left + view.width / 2, y: view.top + 6, width: 0, height: 0 };
    anchors.push({ text, box: corner, ...plateSize(sheet, text, labelSize) });
  }
  placeLabels(anchors, boundsOf(view)).forEach((place, k) => drawPlate(sheet, anchors[k]!.text, place, labelSize));
}

const boundsOf = (view: BoardView) => ({
  x: view.left + 1,
  y: view.top + 1,
  width: view.width - 2,
  height: view.height - 2,
});

function hatch({ pdf }: Sheet, view: BoardView, spacing: number, angleDeg: 45 | 135) {
  const box = { x: view.left, y: view.top, width: view.width, height: view.height };
  for (const [x1, y1, x2, y2] of hatchLines(box, spacing, angleDeg)) pdf.moveTo(x1, y1).lineTo(x2, y2);
  pdf.lineWidth(0.5).strokeColor(tones.hatch).stroke();
}

import type { Board } from '#core/board/document.ts';
import { bodyRing, landRings, rectangleRing } from '#core/board/footprint.ts';
import type { MmRing } from '#core/drawing/heat-bands.ts';
import { type LabelBox, placeLabels } from '#core/drawing/place-labels.ts';
import { viaCentres } from '#core/thermal/via-conductance.ts';
import { ink, type Sheet } from '../sheet.ts';
import { type BoardView, boxOnPage, drawPlate, plateSize, traceRing } from './board-view.ts';

type Options = {
  /** Face whose parts are drawn solid; those of the other one are dashed. */
  side: 'top' | 'bottom';
  /** Text beside a regulator or heat source, by its reference; none where it gives null. */
  label: (ref: string) => string | null;
  size: number;
};

export type DrawnParts = { texts: readonly LabelBox[]; parts: readonly LabelBox[] };

/** Lands, bodies and probes, with a text beside each part that hides none of them. @returns where texts and parts stand */
export function drawParts(sheet: Sheet, view: BoardView, board: Board, { side, label, size }: Options): DrawnParts {
  const { pdf } = sheet;
  const parts = partRings(board);
  for (const part of parts) {
    pdf.strokeColor(ink);
    if (part.side !== side) pdf.dash(1.6, { space: 1.4 });
    for (const ring of part.lands) {
      traceRing(sheet, view, ring);
      pdf.lineWidth(0.45).stroke();
    }
    for (const ring of part.bodies) {
      traceRing(sheet, view, ring);
      pdf.lineWidth(0.9).stroke();
    }
    pdf.undash();
  }
  for (const probe of board.probes) {
    const [x, y] = [view.x(probe.at[0]), view.y(probe.at[1])];
    pdf.lineWidth(0.7).strokeColor(ink);
    pdf
      .moveTo(x - 3, y)
      .lineTo(x + 3, y)
      .moveTo(x, y - 3)
      .lineTo(x, y + 3)
      .stroke();
  }
  const boxes = parts.map(({ bodies, lands }) => boxOnPage(view, [...bodies, ...lands]));
  const named = parts.flatMap((part, index) => {
    const text = label(part.ref);
    return text === null ? [] : [{ text, box: boxes[index]!, ...plateSize(sheet, text, size) }];
  });
  const bounds = { x: view.left + 1, y: view.top + 1, width: view.width - 2, height: view.height - 2 };
  const places = placeLabels(named, bounds, boxes);
  places.forEach((place, index) => drawPlate(sheet, named[index]!.text, place, size));
  return { texts: places, parts: boxes };
}

export function drawVias({ pdf }: Sheet, view: BoardView, board: Board, layer: string): void {
  const order = board.stackup.copper.map(({ name }) => name);
  const at = order.indexOf(layer);
  for (const field of board.viaFields) {
    if (at < order.indexOf(field.from) || at > order.indexOf(field.to)) continue;
    const radius = Math.max(0.45, (field.drillMm / 2) * view.pointsPerMm);
    for (const [x, y] of viaCentres(field)) pdf.circle(view.x(x), view.y(y), radius);
    pdf.lineWidth(0.4).fillAndStroke('#ffffff', ink);
  }
}

type PartRings = { ref: string; side: 'top' | 'bottom'; bodies: MmRing[]; lands: MmRing[] };

function partRings(board: Board): PartRings[] {
  return [
    ...board.regulators.map((regulator): PartRings => {
      const body = bodyRing(board, regulator);
      return {
        ref: regulator.ref,
        side: regulator.side,
        bodies: [body ?? rectangleRing(regulator.at, [2, 2], 0)],
        lands: landRings(board, regulator).map(({ ring }) => ring),
      };
    }),
    ...board.sources.map((source): PartRings => ({
      ref: source.ref,
      side: source.side,
      bodies: [rectangleRing(source.at, source.sizeMm, source.rotationDeg)],
      lands: [],
    })),
  ];
}

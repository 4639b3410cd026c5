import type { Board } from '#core/board/document.ts';
import { bodyRing, landRings, rectangleRing } from '#core/board/footprint.ts';
import { type LabelBox, placeLabels } from '#core/drawing/place-labels.ts';
import { formatQuantity } from '#core/format.ts';
import type { Verdict } from '#core/result/result.ts';
import { toScreen } from '../camera.ts';
import { type Sheet, textWidth } from './sheet.ts';

/** What stands beside a part on the canvas. */
export type PartMark = { ref: string; temperatureC: number | null; verdict: Verdict };

/** Reference, temperature and verdict of one regulator, and where they stand on the screen, px. */
export type Plate = {
  ref: string;
  temperature: string;
  mark: PartMark | undefined;
  refWidth: number;
  /** Body and lands of the regulator. */
  footprint: LabelBox;
  place: LabelBox;
};

export const plateTextPx = 13;
export const plateShapePx = 12;
export const plateGapPx = 7;
const plateHeight = 20;

/** Plates of all regulators: beside their parts, clear of each other, and of other parts as far as there is room. */
export function placePlates(sheet: Sheet, board: Board, marks: ReadonlyMap<string, PartMark>): Plate[] {
  const plates = board.regulators.map((regulator) => {
    const mark = marks.get(regulator.ref);
    const temperature = mark ? ` ${formatQuantity(mark.temperatureC, '°C')}` : '';
    const refWidth = textWidth(sheet, regulator.ref, plateTextPx, true);
    const shape = mark ? plateShapePx + 6 : 0;
    const width = refWidth + textWidth(sheet, temperature, plateTextPx) + shape + 12;
    const lands = landRings(board, regulator).flatMap(({ ring }) => ring);
    const footprint = screenBox(sheet, [...(bodyRing(board, regulator) ?? [regulator.at]), ...lands]);
    return { width, plate: { ref: regulator.ref, temperature, mark, refWidth, footprint } };
  });
  const places = placeLabels(
    plates.map(({ width, plate }) => ({ box: plate.footprint, width, height: plateHeight })),
    { x: 0, y: 0, width: sheet.view.width, height: sheet.view.height },
    [...plates.map(({ plate }) => plate.footprint), ...namedBoxes(sheet, board)],
    plateGapPx,
  );
  return plates.flatMap(({ plate }, index) => {
    const place = places[index];
    return place ? [{ ...plate, place }] : [];
  });
}

/** What no figure should cover: parts and the plates beside them, sources, sinks and probes with their names. */
export function occupiedBoxes(sheet: Sheet, board: Board, plates: readonly Plate[]): LabelBox[] {
  return [...plates.flatMap(({ footprint, place }) => [footprint, place]), ...namedBoxes(sheet, board)];
}

/** Sources, sinks and probes with the names drawn on them or beside them. */
function namedBoxes(sheet: Sheet, board: Board): LabelBox[] {
  const onThem = [
    ...board.sources.map((source) => ({
      name: source.ref,
      at: source.at,
      ring: rectangleRing(source.at, source.bodyMm ?? source.sizeMm, source.rotationDeg),
    })),
    ...board.sinks.map(({ id, at, sizeMm }) => ({ name: id, at, ring: rectangleRing(at, sizeMm, 0) })),
  ].flatMap(({ name, at, ring }) => {
    const [x, y] = toScreen(sheet.camera, sheet.view, at);
    const width = textWidth(sheet, name, 11, true) + 8;
    return [screenBox(sheet, ring), { x: x - width / 2, y: y - 8, width, height: 16 }];
  });
  const probes = board.probes.flatMap(({ id, at }) => {
    const [x, y] = toScreen(sheet.camera, sheet.view, at);
    return [
      { x: x - 10, y: y - 10, width: 20, height: 20 },
      { x: x + 10, y: y - 17, width: textWidth(sheet, id, 11) + 4, height: 16 },
    ];
  });
  return [...onThem, ...probes];
}

function screenBox({ camera, view }: Sheet, points: readonly (readonly [number, number])[]): LabelBox {
  const shown = points.map((point) => toScreen(camera, view, point));
  const [xs, ys] = [shown.map(([x]) => x), shown.map(([, y]) => y)];
  const [x, y] = [Math.min(...xs), Math.min(...ys)];
  return { x, y, width: Math.max(...xs) - x, height: Math.max(...ys) - y };
}

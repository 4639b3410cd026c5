import { expect, test } from 'vitest';
import type { Board } from '#core/board/document.ts';
import type { Point } from '#core/board/outline.ts';
import { hardBoard, hardBoardMm } from './hard-board.ts';
import { solved } from './solved-board.ts';

const powers = { U1: 0.9, U2: 0.3, Q1: 0.25 };
const [length, width] = hardBoardMm;
/** Everything on lines of the sub-cells, so that a moved board meets the same raster. */
const board = hardBoard({
  sources: [{ ref: 'Q1', at: [17, 5], sizeMm: [2, 3], bodyMm: [2, 3, 1], powerW: 0.2 }],
  viaFields: [{ ...hardBoard().viaFields[0]!, at: [8.3, 13.3] }],
  probes: [
    { id: 'a', at: [5.25, 4.5] },
    { id: 'b', at: [27, 16.75], side: 'bottom' },
  ],
});
/** On cells of 0.5 mm (sub-cells of 0.125 mm) no shape ends on a line of centres and no via stands on a line between two cells. */
const cellMm = 0.5;

type Motion = { point: (point: Point) => Point; turnDeg: number; mirrored: boolean };

function moved(given: Board, { point, turnDeg, mirrored }: Motion): Board {
  const ring = (points: Point[]) => points.map(point);
  const turned = (degrees: number) => (mirrored ? -degrees : degrees) + turnDeg;
  const swap = Math.abs(turnDeg) === 90;
  return {
    ...given,
    outline: { points: ring(given.outline.points), cutouts: given.outline.cutouts.map(ring) },
    pours: given.pours.map((pour) => ({ ...pour, points: ring(pour.points), holes: pour.holes.map(ring) })),
    viaFields: given.viaFields.map((via) => ({ ...via, at: point(via.at), rotationDeg: turned(via.rotationDeg) })),
    regulators: given.regulators.map((part) => ({
      ...part,
      at: point(part.at),
      rotationDeg: turned(part.rotationDeg),
    })),
    sources: given.sources.map((part) => ({ ...part, at: point(part.at), rotationDeg: turned(part.rotationDeg) })),
    sinks: given.sinks.map((sink) => ({
      ...sink,
      at: point(sink.at),
      sizeMm: swap ? [sink.sizeMm[1], sink.sizeMm[0]] : sink.sizeMm,
    })),
    probes: given.probes.map((probe) => ({ ...probe, at: point(probe.at) })),
  };
}

const motions: [string, Motion][] = [
  ['mirrored in x', { point: ([x, y]) => [length - x, y], turnDeg: 0, mirrored: true }],
  ['turned by 180°', { point: ([x, y]) => [length - x, width - y], turnDeg: 180, mirrored: false }],
  ['turned by 90°', { point: ([x, y]) => [width - y, x], turnDeg: 90, mirrored: false }],
  ['moved by odd millimetres', { point: ([x, y]) => [x + 413.7, y - 91.3], turnDeg: 0, mirrored: false }],
];

test.each(motions.flatMap(([name, motion]) => [null, 9].map((film) => [name, film, motion] as const)))(
  'a board %s, film %s – junctions, source, probes – the same',
  (_, filmWPerM2K, motion) => {
    // The package is symmetric in x, so that a mirrored part is the part turned.
    const [one, other] = [board, moved(board, motion)].map((given) => solved(given, powers, { filmWPerM2K }, cellMm));
    // Still air settles to 0.003 K of its films; a fixed film leaves the solver's tolerance alone.
    const most = filmWPerM2K === null ? 2e-4 : 1e-6;
    const apart = (a: number, b: number) => Math.abs(b - a) / (a - 25);
    for (const [ref, heat] of one!.regulators) {
      expect(apart(heat.junctionC, other!.regulators.get(ref)!.junctionC), ref).toBeLessThan(most);
      expect(apart(heat.caseTopC, other!.regulators.get(ref)!.caseTopC), ref).toBeLessThan(most);
    }
    for (const [id, at] of one!.probes) expect(apart(at, other!.probes.get(id)!), id).toBeLessThan(most);
    expect(apart(one!.sources.get('Q1')!.meanC, other!.sources.get('Q1')!.meanC)).toBeLessThan(most);
  },
);

test('everything listed the other way round – junctions – the same', () => {
  const reversed: Board = {
    ...board,
    regulators: board.regulators.toReversed(),
    pours: board.pours.toReversed(),
    packages: Object.fromEntries(
      Object.entries(board.packages).map(([key, model]) => [key, { ...model, lands: model.lands.toReversed() }]),
    ),
    probes: board.probes.toReversed(),
  };
  const [one, other] = [board, reversed].map((given) => solved(given, powers, { filmWPerM2K: 9 }, cellMm));
  for (const [ref, heat] of one!.regulators) {
    expect((other!.regulators.get(ref)!.junctionC - 25) / (heat.junctionC - 25)).toBeCloseTo(1, 7);
  }
});

test('parts and nets under other names – junctions – the same', () => {
  const renamed: Board = JSON.parse(
    JSON.stringify(board).replaceAll('"U1"', '"X900"').replaceAll('"T"', '"ZZ"').replaceAll('"PWR"', '"A0"'),
  );
  const one = solved(board, powers, {}, cellMm);
  const other = solved(renamed, { X900: 0.9, U2: 0.3, Q1: 0.25 }, {}, cellMm);
  expect(other.regulators.get('X900')!.junctionC).toBe(one.regulators.get('U1')!.junctionC);
  expect(other.regulators.get('U2')!.junctionC).toBe(one.regulators.get('U2')!.junctionC);
});

test('air that turns with the board – junctions – the same', () => {
  const [, , , shift] = motions;
  const [, quarter] = motions[2]!;
  const air = (towardDeg: number) => ({ air: { kind: 'moving' as const, speedMPerS: 1.5, towardDeg } });
  // The air is followed over blocks of 1.5 mm or so: cells of 1 mm give blocks of 2 mm, which divide the board.
  const one = solved(board, powers, air(0), 1);
  const turned = solved(moved(board, quarter), powers, air(90), 1);
  const shifted = solved(moved(board, shift![1]), powers, air(0), 1);
  for (const [ref, { junctionC }] of one.regulators) {
    expect(Math.abs(turned.regulators.get(ref)!.junctionC - junctionC) / (junctionC - 25)).toBeLessThan(2e-4);
    expect(Math.abs(shifted.regulators.get(ref)!.junctionC - junctionC) / (junctionC - 25)).toBeLessThan(2e-4);
  }
});

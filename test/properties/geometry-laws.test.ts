import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Board } from '#core/board/document.ts';
import { boundsOf } from '#core/geometry/polygon.ts';
import type { Point } from '#core/board/outline.ts';
import { propertyRuns, propertySeed, propertyTimeout } from './property-runs.ts';
import { randomBoard, withFixedFilm } from './random-board.ts';
import { apart, solvedRises } from './solved-junctions.ts';

/** With a fixed film what is left between two equal networks is the solver's tolerance. */
const same = 1e-6;

const holds = (change: (board: Board, by: number) => Board, most = same) =>
  fc.assert(
    fc.property(randomBoard, fc.nat(999), ({ board }, by) => {
      const fixed = withFixedFilm(board);
      expect(apart(solvedRises(fixed), solvedRises(change(fixed, by)))).toBeLessThan(most);
    }),
    { seed: propertySeed, numRuns: propertyRuns },
  );

type Motion = { point: (point: Point) => Point; angle: (degrees: number) => number; swap: boolean };

function moved(board: Board, { point, angle, swap }: Motion): Board {
  const placed = <T extends { at: Point; rotationDeg: number }>(one: T): T => ({
    ...one,
    at: point(one.at),
    rotationDeg: angle(one.rotationDeg) % 360,
  });
  return {
    ...board,
    outline: { points: board.outline.points.map(point), cutouts: board.outline.cutouts.map((ring) => ring.map(point)) },
    pours: board.pours.map((pour) => ({
      ...pour,
      points: pour.points.map(point),
      holes: pour.holes.map((ring) => ring.map(point)),
    })),
    viaFields: board.viaFields.map(placed),
    regulators: board.regulators.map(placed),
    sources: board.sources.map(placed),
    sinks: board.sinks.map((sink) => ({
      ...sink,
      at: point(sink.at),
      sizeMm: swap ? [sink.sizeMm[1], sink.sizeMm[0]] : sink.sizeMm,
    })),
    probes: board.probes.map((probe) => ({ ...probe, at: point(probe.at) })),
  };
}
const widthOf = (board: Board) => boundsOf(board.outline.points).maxX;

test('any board – mirrored – keeps its temperatures', { timeout: propertyTimeout }, () => {
  // Every package of the catalogue is symmetric in x, so that a mirrored part is the part turned the other way.
  holds((board) =>
    moved(board, { point: ([x, y]) => [widthOf(board) - x, y], angle: (degrees) => -degrees, swap: false }),
  );
});

test('any board – turned by 90° – keeps its temperatures', { timeout: propertyTimeout }, () => {
  holds((board) => moved(board, { point: ([x, y]) => [-y, x], angle: (degrees) => degrees + 90, swap: true }));
});

test('any board – moved – keeps its temperatures', { timeout: propertyTimeout }, () => {
  holds((board, by) =>
    moved(board, { point: ([x, y]) => [x + 1.37 * by, y - 0.73 * by], angle: (degrees) => degrees, swap: false }),
  );
});

test(
  'any board of one net – its objects listed the other way round – keeps its temperatures',
  {
    timeout: propertyTimeout,
  },
  () => {
    // Copper of two nets on one spot belongs to the later one, so that the order of pours is free within a net only.
    const oneNet = (board: Board) => ({ ...board, pours: board.pours.map((pour) => ({ ...pour, net: 'GND' })) });
    fc.assert(
      fc.property(randomBoard, ({ board }) => {
        const fixed = withFixedFilm(oneNet(board));
        const reversed: Board = {
          ...fixed,
          pours: fixed.pours.toReversed(),
          viaFields: fixed.viaFields.toReversed(),
          sources: fixed.sources.toReversed(),
          probes: fixed.probes.toReversed(),
        };
        expect(apart(solvedRises(fixed), solvedRises(reversed))).toBeLessThan(same);
      }),
      { seed: propertySeed, numRuns: propertyRuns },
    );
  },
);

/** A pour as two that touch along a line of the lattice; pours with holes stay whole. */
function split(board: Board, by: number): Board {
  return {
    ...board,
    pours: board.pours.flatMap((pour, k) => {
      const { minX, maxX, minY, maxY } = boundsOf(pour.points);
      const steps = Math.round((maxX - minX) / 0.15);
      if (pour.holes.length > 0 || steps < 2) return [pour];
      const at = minX + 0.15 * (1 + ((by + k) % (steps - 1)));
      const part = (id: string, from: number, to: number) => ({
        ...pour,
        id,
        points: [
          [from, minY],
          [to, minY],
          [to, maxY],
          [from, maxY],
        ] as Point[],
      });
      return [part(`${pour.id}a`, minX, at), part(`${pour.id}b`, at, maxX)];
    }),
  };
}

test('any board – pours split in two – keeps its temperatures', { timeout: propertyTimeout }, () => {
  holds(split);
});

test('any board – via fields as single vias – keeps its temperatures', { timeout: propertyTimeout }, () => {
  holds((board) => ({
    ...board,
    viaFields: board.viaFields.flatMap((field) => {
      const pitch = field.pitchMm as number;
      return Array.from({ length: field.rows * field.columns }, (_, k) => {
        const column = (k % field.columns) - (field.columns - 1) / 2;
        const row = Math.floor(k / field.columns) - (field.rows - 1) / 2;
        return {
          ...field,
          id: `${field.id}.${k}`,
          columns: 1,
          rows: 1,
          at: [field.at[0] + column * pitch, field.at[1] + row * pitch] as Point,
        };
      });
    }),
  }));
});

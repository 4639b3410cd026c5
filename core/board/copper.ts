import { z } from 'zod';
import { name, objectId } from './name.ts';
import { point, ring } from './outline.ts';
import { count, quantity, shown } from './quantity.ts';
import { coverage, emissivity } from './stackup.ts';

/** Copper of one net on one layer. Where pours of one net overlap they count once, the highest coverage rules. */
export const pour = z.strictObject({
  id: objectId,
  layer: name,
  net: name,
  points: ring,
  holes: z.array(ring).max(200).default([]),
  coverage: coverage.default(1),
  /** Emissivity of the face over this pour; null: that of the board's face. */
  emissivity: emissivity.nullable().default(null),
});

const pitch = quantity('mm', 0.1, 100);

/** A grid of plated holes; `at` is the centre of the grid, `drillMm` the finished hole. */
export const viaField = z.strictObject({
  id: objectId,
  net: name,
  at: point,
  columns: count(1, 200),
  rows: count(1, 200),
  pitchMm: z.union([pitch, z.tuple([pitch, pitch])], {
    error: (issue) => `must be a pitch from 0.1 to 100 mm or [x, y], found ${shown(issue.input)}`,
  }),
  rotationDeg: quantity('°', -360, 360).default(0),
  drillMm: quantity('mm', 0.05, 10),
  platingUm: quantity('µm', 1, 200),
  filling: z.enum(['open', 'resin', 'copper']),
  from: name,
  to: name,
});

/** A screw, a clip or a chassis contact on a rectangle of one layer. */
export const sink = z.strictObject({
  id: objectId,
  at: point,
  sizeMm: z.tuple([quantity('mm', 0.1, 500), quantity('mm', 0.1, 500)]),
  layer: name,
  conductanceWPerK: quantity('W/K', 0, 1000),
  toC: z.union([z.literal('ambient'), quantity('°C', -100, 300)], {
    error: (issue) => `must be "ambient" or a temperature from -100 to 300 °C, found ${shown(issue.input)}`,
  }),
});

export type Pour = z.output<typeof pour>;
export type ViaField = z.output<typeof viaField>;
export type Sink = z.output<typeof sink>;

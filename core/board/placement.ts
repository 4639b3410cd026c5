import { z } from 'zod';
import { name, objectId } from './name.ts';
import { point } from './outline.ts';
import { quantity, shown } from './quantity.ts';

export const side = z.enum(['top', 'bottom']);
const rotationDeg = quantity('°', -360, 360);
const length = quantity('mm', 0.05, 200);
export const power = quantity('W', 0, 500);

/** What a regulator is fed from: a supply, or another regulator's output. */
export const feed = z.union([z.strictObject({ supply: name }), z.strictObject({ regulator: objectId })], {
  error: (issue) => `must be { "supply": name } or { "regulator": ref }, found ${shown(issue.input)}`,
});

/** Series resistor and/or diode between feed and regulator; `source` names the heat source on the board that it heats. */
export const dropper = z
  .strictObject({
    resistanceOhm: quantity('Ω', 0, 1e6).optional(),
    dropV: quantity('V', 0, 100).optional(),
    source: objectId.optional(),
  })
  .refine((value) => value.resistanceOhm !== undefined || value.dropV !== undefined, {
    error: 'must state resistanceOhm (0 to 1000000 Ω) or dropV (0 to 100 V)',
  });

export const regulator = z.strictObject({
  ref: objectId,
  part: name,
  at: point,
  rotationDeg: rotationDeg.default(0),
  side: side.default('top'),
  nets: z.strictObject({ ground: name, input: name, output: name }),
  feed: feed.nullable().default(null),
  dropper: dropper.nullable().default(null),
  /** Known dissipation; overrides the operating point. */
  powerW: power.nullable().default(null),
});

/** Uniform heat on a rectangle; the film still acts there. `powerW` null: heated only by the droppers that name it. */
export const heatSource = z.strictObject({
  ref: objectId,
  at: point,
  sizeMm: z.tuple([length, length]),
  bodyMm: z.tuple([length, length, length]).nullable().default(null),
  rotationDeg: rotationDeg.default(0),
  side: side.default('top'),
  powerW: power.nullable(),
  limitC: quantity('°C', -50, 500).nullable().default(null),
});

export const probe = z.strictObject({ id: objectId, at: point, side: side.default('top') });

export type Side = z.output<typeof side>;
export type Feed = z.output<typeof feed>;
export type Dropper = z.output<typeof dropper>;
export type Regulator = z.output<typeof regulator>;
export type HeatSource = z.output<typeof heatSource>;
export type Probe = z.output<typeof probe>;

import { z } from 'zod';
import { name, objectId, title } from './name.ts';
import { power } from './placement.ts';
import { quantity, shown } from './quantity.ts';

const voltage = quantity('V', 0, 2000);

export const supply = z.strictObject({ name, minV: voltage, nominalV: voltage, maxV: voltage });

export const air = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('still') }),
  /** `towardDeg`: where the air goes, counter-clockwise from +x. */
  z.strictObject({
    kind: z.literal('moving'),
    speedMPerS: quantity('m/s', 0.05, 30),
    towardDeg: quantity('°', -360, 360).default(0),
  }),
]);

const film = quantity('W/(m²·K)', 0.1, 100000);

export const fault = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('output-short'), ref: objectId }),
  z.strictObject({ kind: z.literal('fan-stopped') }),
]);

/** One operating condition of the board. */
export const condition = z.strictObject({
  name: title,
  /** Outside ambient; the air around the board is ambientC + boxRiseK. */
  ambientC: quantity('°C', -100, 250),
  boxRiseK: quantity('K', 0, 200).default(0),
  altitudeM: quantity('m', -500, 20000).default(0),
  orientation: z.enum(['horizontal', 'vertical']),
  air,
  /** Fixed total film coefficient per face; replaces convection and radiation on the board and on case tops. */
  filmWPerM2K: z
    .union([film, z.strictObject({ top: film, bottom: film })], {
      error: (issue) =>
        `must be a number from 0.1 to 100000 W/(m²·K) or { "top", "bottom" }, found ${shown(issue.input)}`,
    })
    .nullable()
    .default(null),
  /** Voltage by supply; a supply not named stands at its maximum. */
  supplies: z.record(name, voltage).default({}),
  /** Output current by regulator. */
  loadsA: z.record(objectId, quantity('A', 0, 200)).default({}),
  /** Power by heat source, in place of the source's own. */
  powersW: z.record(objectId, power).default({}),
  fault: fault.nullable().default(null),
});

export type Supply = z.output<typeof supply>;
export type Air = z.output<typeof air>;
export type Fault = z.output<typeof fault>;
export type Condition = z.output<typeof condition>;

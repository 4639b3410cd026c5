import { z } from 'zod';
import { name, source } from './name.ts';
import { quantity, shown } from './quantity.ts';

const current = quantity('A', 0, 200);
const voltage = quantity('V', 0, 2000);

/** Output current → value, straight between the points, constant beyond the last; currents rising. */
const currentTable = (value: typeof current) =>
  z
    .array(z.tuple([current, value], { error: (issue) => `must be a pair [A, value], found ${shown(issue.input)}` }))
    .min(1)
    .max(100);

export const currentLimit = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('constant'), limitA: current }),
  z.strictObject({ kind: z.literal('foldback'), kneeA: current, shortA: current }),
]);

/** Which of the regulator's nets a land lies on; none: copper of its own. */
export const landNet = z.enum(['ground', 'input', 'output', 'none']);

/** A linear regulator as its data sheet gives it. */
export const part = z.strictObject({
  name,
  package: name,
  passElement: z.enum(['npn-darlington', 'npn-pnp', 'pnp', 'pmos', 'nmos']),
  outputV: voltage,
  outputTolerancePct: quantity('%', 0, 50),
  inputMaxV: voltage,
  outputMaxA: current,
  /** Largest dropout over temperature. */
  dropoutV: currentTable(quantity('V', 0, 100)),
  /** Ground-pin current. */
  groundA: currentTable(quantity('A', 0, 50)),
  currentLimit: currentLimit.nullable().default(null),
  /** By land name of the package; a land not named lies on none. */
  landNets: z.record(name, landNet),
  /** The maker's maximum junction temperature. */
  junctionMaxC: quantity('°C', 50, 3000),
  shutdownC: quantity('°C', 50, 400).nullable().default(null),
  source,
});

export type CurrentLimit = z.output<typeof currentLimit>;
export type LandNet = z.output<typeof landNet>;
export type Part = z.output<typeof part>;
export type PassElement = Part['passElement'];

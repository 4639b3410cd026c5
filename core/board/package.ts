import { z } from 'zod';
import { name, source } from './name.ts';
import { point } from './outline.ts';
import { quantity } from './quantity.ts';
import { emissivity } from './stackup.ts';

/** Up to 1e6 K/W, so that a path can be switched off in a test case. */
const resistance = quantity('K/W', 0.01, 1e6);
const length = quantity('mm', 0.05, 200);

export const pad = z.strictObject({ at: point, sizeMm: z.tuple([length, length]) });

/** One node of the package: `kPerW` is junction to this land, all its pads together. A ball array is a land of kind lead. */
export const land = z.strictObject({
  name,
  kind: z.enum(['tab', 'lead']),
  pads: z.array(pad).min(1).max(1000),
  kPerW: resistance,
});

/** Compact thermal model of a package outline: a star from the junction to its lands, its case top and the air gap below. */
export const packageModel = z.strictObject({
  name,
  /** Length (x), width (y) and height of the body. */
  bodyMm: z.tuple([length, length, length]),
  emissivity: emissivity.default(0.9),
  caseTopKPerW: resistance,
  /** Junction to the board under the body where there is no pad; null: no such path. */
  underBodyKPerW: resistance.nullable().default(null),
  lands: z.array(land).min(1).max(64),
  /** Characterisation parameter, never a branch (JESD51-12); serves to read measurements. */
  psiJtKPerW: quantity('K/W', 0, 1000).nullable().default(null),
  source,
});

export type Pad = z.output<typeof pad>;
export type Land = z.output<typeof land>;
export type PackageModel = z.output<typeof packageModel>;

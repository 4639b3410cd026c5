import { z } from 'zod';
import { name } from './name.ts';
import { quantity } from './quantity.ts';

export const emissivity = quantity('', 0.01, 1);
export const coverage = quantity('', 0, 1);

/** A solid or perforated plane over the whole outline, drawn in by `insetMm`. */
export const plane = z.strictObject({
  net: name,
  coverage: coverage.default(1),
  insetMm: quantity('mm', 0, 100).default(0),
});

export const copperLayer = z.strictObject({
  name,
  thicknessUm: quantity('µm', 1, 500),
  plane: plane.nullable().default(null),
  /** Unconnected background copper over the whole layer, on no net. */
  traces: z.strictObject({ coverage }).nullable().default(null),
});

/** Laminate between two copper layers; up to 500 W/(m·K) so that a metal core can be stated. */
export const dielectricLayer = z.strictObject({
  thicknessMm: quantity('mm', 0.01, 10),
  inPlaneWPerMK: quantity('W/(m·K)', 0.05, 500),
  throughWPerMK: quantity('W/(m·K)', 0.05, 500),
});

export const stackup = z.strictObject({
  copper: z.array(copperLayer).min(1, { error: 'must have at least 1 copper layer' }).max(32),
  dielectric: z.array(dielectricLayer).max(31),
  emissivityTop: emissivity.default(0.9),
  emissivityBottom: emissivity.default(0.9),
  /** Maximum operating temperature of the laminate (the term of UL 796). */
  maxOperatingC: quantity('°C', 50, 400),
});

export type CopperLayer = z.output<typeof copperLayer>;
export type DielectricLayer = z.output<typeof dielectricLayer>;
export type Stackup = z.output<typeof stackup>;

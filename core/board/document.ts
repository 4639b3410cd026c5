import { z } from 'zod';
import { condition, supply } from './condition.ts';
import { pour, sink, viaField } from './copper.ts';
import { criteria } from './criteria.ts';
import { name, title } from './name.ts';
import { outline } from './outline.ts';
import { packageModel } from './package.ts';
import { part } from './part.ts';
import { heatSource, probe, regulator } from './placement.ts';
import { stackup } from './stackup.ts';

export const boardFormat = 'dropwatt-board';
export const boardVersion = 1;

/**
 * The board document, version 1: the one contract between canvas, API, command line, import and export.
 * Lengths in mm (copper in µm), temperatures in °C, rises in K, power in W, angles in degrees counter-clockwise.
 * Shape only; what refers to what is checked by `crossCheck`.
 */
export const boardDocument = z
  .strictObject({
    format: z.literal(boardFormat, { error: `must be "${boardFormat}"` }),
    version: z.literal(boardVersion, { error: `must be ${boardVersion}` }),
    title,
    outline,
    stackup,
    pours: z.array(pour).max(2000),
    viaFields: z.array(viaField).max(1000),
    packages: z.record(name, packageModel),
    parts: z.record(name, part),
    regulators: z.array(regulator).max(200),
    sources: z.array(heatSource).max(500).default([]),
    sinks: z.array(sink).max(200).default([]),
    probes: z.array(probe).max(500).default([]),
    supplies: z.array(supply).max(50).default([]),
    conditions: z.array(condition).max(60),
    criteria,
  })
  .meta({ id: 'BoardDocument', title: 'Dropwatt board document' });

/** A document as written: what has a default may be missing. */
export type BoardDocument = z.input<typeof boardDocument>;
/** A document with every default filled in; never changed in place. */
export type Board = z.output<typeof boardDocument>;

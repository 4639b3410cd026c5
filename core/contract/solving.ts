import { z } from 'zod';
import { packageModel } from '#core/board/package.ts';
import { part } from '#core/board/part.ts';
import { criteria } from '#core/board/criteria.ts';
import { dielectricLayer } from '#core/board/stackup.ts';
import { checkResult } from '#core/result/result.ts';
import { id, timestamp } from './identifier.ts';

export const jobView = z
  .strictObject({
    id,
    state: z.enum(['waiting', 'running', 'done', 'failed', 'cancelled']),
    /** Conditions done and in all. */
    done: z.int(),
    total: z.int(),
    message: z.string().nullable(),
  })
  .meta({ id: 'SolveJob' });

export const storedResult = z
  .strictObject({
    result: checkResult,
    /** Version of the sketch that was solved, and whether it is still the present one. */
    sketchVersion: z.int(),
    upToDate: z.boolean(),
    solvedAt: timestamp,
  })
  .meta({ id: 'StoredResult' });

/** One condition's heat field; temperatures as little-endian Float32 in base64, NaN where there is no board. */
export const heatFieldView = z
  .strictObject({
    condition: z.string(),
    columns: z.int(),
    rows: z.int(),
    xEdgesMm: z.array(z.number()),
    yEdgesMm: z.array(z.number()),
    layers: z.array(z.strictObject({ name: z.string(), temperatureC: z.base64() })),
  })
  .meta({ id: 'HeatField' });

export const libraryView = z
  .strictObject({
    packages: z.record(z.string(), packageModel),
    parts: z.record(z.string(), part),
    criteria: z.array(criteria),
    laminates: z.array(
      z.strictObject({ name: z.string(), layer: dielectricLayer.omit({ thicknessMm: true }), source: z.string() }),
    ),
  })
  .meta({ id: 'Library' });

export type JobView = z.output<typeof jobView>;
export type StoredResult = z.output<typeof storedResult>;
export type HeatFieldView = z.output<typeof heatFieldView>;
export type LibraryView = z.output<typeof libraryView>;

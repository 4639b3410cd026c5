import { z } from 'zod';

/** RFC 9457 problem document; `code` is stable, `faults` lists every field that was refused. */
export const problem = z
  .strictObject({
    type: z.string(),
    title: z.string(),
    status: z.int(),
    code: z.string(),
    detail: z.string(),
    instance: z.string().optional(),
    faults: z.array(z.strictObject({ path: z.string(), message: z.string() })).optional(),
    /** Guards that refused a change of state. */
    reasons: z.array(z.strictObject({ code: z.string(), message: z.string() })).optional(),
    /** On 412: what the sketch is now, who saved it and when. */
    current: z.strictObject({ version: z.int(), savedBy: z.string(), savedAt: z.string() }).optional(),
  })
  .meta({ id: 'Problem' });
export type Problem = z.output<typeof problem>;

import { z } from 'zod';
import { quantity, shown } from './quantity.ts';

/** A point in mm: x to the right, y up, board seen from the top. */
export const point = z.tuple([quantity('mm', -2000, 2000), quantity('mm', -2000, 2000)], {
  error: (issue) => `must be a point [x, y] in mm, found ${shown(issue.input)}`,
});
/** A closed ring in mm, last point joined to the first; either sense of rotation. */
export const ring = z
  .array(point, { error: 'must be a list of points [x, y] in mm' })
  .min(3, { error: 'must have at least 3 points' })
  .max(2000, { error: 'must have at most 2000 points' });

export const outline = z.strictObject({
  points: ring,
  cutouts: z.array(ring).max(200).default([]),
});

export type Point = z.output<typeof point>;
export type Ring = z.output<typeof ring>;
export type Outline = z.output<typeof outline>;

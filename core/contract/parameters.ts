import { z } from 'zod';
import { cursor, id } from './identifier.ts';

export const revisionParams = z.strictObject({ revisionId: id });
export const assemblyParams = z.strictObject({ assemblyId: id });

/** A whole list. */
export const list = <T extends z.ZodType>(item: T) => z.strictObject({ items: z.array(item) });
/** A page of a long list; `next` is the cursor of the next one. */
export const page = <T extends z.ZodType>(item: T) => z.strictObject({ items: z.array(item), next: cursor.nullable() });

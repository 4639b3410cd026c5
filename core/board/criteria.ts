import { z } from 'zod';
import { name, source } from './name.ts';
import { quantity } from './quantity.ts';

export const ruleQuantity = z.enum(['junctionC', 'inputV', 'outputA']);

/** How sure a value of a criteria document is: read there, quoted by another public text, common practice, or from memory. */
export const mark = z.enum(['read', 'second-hand', 'common-practice', 'house', 'unverified']);

/** One derating rule; of several comparisons in it the lowest limit counts. */
export const rule = z
  .strictObject({
    quantity: ruleQuantity,
    /** Kelvins below the maker's maximum. */
    belowMaxK: quantity('K', 0, 500).optional(),
    atMostC: quantity('°C', -50, 3000).optional(),
    /** Stress ratio: actual ÷ rated. */
    ratio: quantity('', 0.01, 1).optional(),
    document: source.optional(),
    revision: name.optional(),
    clause: name.optional(),
    level: name.optional(),
    mark: mark.optional(),
    source: source.optional(),
  })
  .refine((value) => value.belowMaxK !== undefined || value.atMostC !== undefined || value.ratio !== undefined, {
    error: 'must state at least one of belowMaxK (K), atMostC (°C) and ratio',
  })
  .refine((value) => value.quantity === 'junctionC' || (value.belowMaxK === undefined && value.atMostC === undefined), {
    error: 'belowMaxK and atMostC apply to junctionC only; use ratio',
  });

export const criteria = z.strictObject({
  name,
  version: name.optional(),
  rules: z.array(rule).max(100),
});

export type RuleQuantity = z.output<typeof ruleQuantity>;
export type Rule = z.output<typeof rule>;
export type Criteria = z.output<typeof criteria>;

import { z } from 'zod';

/** The result document, version 1: what `check` prints, what the server stores and what the record is made from. */
const optionalNumber = z.number().nullable();

export const verdict = z.enum(['within', 'close', 'over', 'not evaluated']);

export const limitResult = z.strictObject({
  quantity: z.enum(['junctionC', 'inputV', 'outputA']),
  actual: optionalNumber,
  limit: optionalNumber,
  /** limit − actual, in the quantity's own unit (K for temperatures). */
  margin: optionalNumber,
  /** Stress ratio actual ÷ rated, where the rule is a ratio. */
  ratio: optionalNumber,
  verdict,
  source: z.string(),
});

/** One junction from the outside ambient up, in kelvins; the parts sum to junction − ambient. */
export const ladder = z.strictObject({
  box: z.number(),
  air: z.number(),
  neighbours: z.number(),
  board: z.number(),
  package: z.number(),
});

export const regulatorResult = z.strictObject({
  ref: z.string(),
  dissipationW: optionalNumber,
  junctionC: optionalNumber,
  /** One combined band: grid error and model error. */
  uncertaintyK: optionalNumber,
  gridErrorK: optionalNumber,
  modelErrorK: optionalNumber,
  caseTopC: optionalNumber,
  /** Hottest land. */
  landC: optionalNumber,
  /** Rise of the junction over the local air per own watt, neighbours included. */
  thetaJaKPerW: optionalNumber,
  inputV: optionalNumber,
  outputV: optionalNumber,
  outputA: optionalNumber,
  groundA: optionalNumber,
  /** Lowest input − droppers − highest output − dropout; null where an input is missing. */
  headroomV: optionalNumber,
  regulating: z.boolean().nullable(),
  shutsDown: z.boolean(),
  ladderK: ladder.nullable(),
  limits: z.array(limitResult),
  verdict,
});

export const sourceResult = z.strictObject({
  ref: z.string(),
  /** With the heat of the droppers that name it; null where nothing says how much. */
  powerW: optionalNumber,
  /** Mean of the rectangle. */
  temperatureC: optionalNumber,
  maxC: optionalNumber,
  limitC: optionalNumber,
  verdict,
});

export const conditionResult = z.strictObject({
  name: z.string(),
  status: z.enum(['converged', 'not-converged', 'invalid']),
  message: z.string().nullable(),
  regulators: z.array(regulatorResult),
  sources: z.array(sourceResult),
  probes: z.array(z.strictObject({ id: z.string(), temperatureC: optionalNumber })),
  /** Heat ledger: rise in kelvins that each source of heat gives each regulator's junction. */
  ledger: z.array(z.strictObject({ victim: z.string(), source: z.string(), riseK: z.number() })),
  board: z.strictObject({ maxC: z.number(), maxAt: z.tuple([z.number(), z.number()]), meanC: z.number() }).nullable(),
  energy: z.strictObject({ inW: z.number(), outW: z.number(), imbalance: z.number() }).nullable(),
  solver: z
    .strictObject({
      cells: z.number(),
      cellMm: z.number(),
      iterations: z.number(),
      /** ‖b − A·x‖ ÷ ‖b‖, recomputed at the end. */
      residual: z.number(),
      gridErrorK: optionalNumber,
      milliseconds: z.number(),
    })
    .nullable(),
  verdict,
});

export const finding = z.strictObject({
  rule: z.string(),
  severity: z.enum(['stop', 'warn', 'note']),
  /** Object it is about (regulator, source, pour, via field, condition); null: the whole board. */
  ref: z.string().nullable(),
  condition: z.string().nullable(),
  message: z.string(),
  remedy: z.string(),
});

export const caution = z.strictObject({
  kind: z.enum(['hot-surface', 'laminate', 'neighbour', 'fire', 'general']),
  ref: z.string().nullable(),
  condition: z.string().nullable(),
  message: z.string(),
});

export const assumption = z.strictObject({ path: z.string(), value: z.unknown() });

export const checkResult = z
  .strictObject({
    format: z.literal('dropwatt-result'),
    version: z.literal(1),
    /** Method version: a change in numbers is a new one. */
    method: z.string(),
    inputHash: z.string(),
    title: z.string(),
    conditions: z.array(conditionResult),
    findings: z.array(finding),
    cautions: z.array(caution),
    assumptions: z.array(assumption),
    verdict,
  })
  .meta({ id: 'CheckResult', title: 'Dropwatt result document' });

export type Verdict = z.output<typeof verdict>;
export type LimitResult = z.output<typeof limitResult>;
export type Ladder = z.output<typeof ladder>;
export type RegulatorResult = z.output<typeof regulatorResult>;
export type SourceResult = z.output<typeof sourceResult>;
export type ConditionResult = z.output<typeof conditionResult>;
export type Finding = z.output<typeof finding>;
export type Caution = z.output<typeof caution>;
export type Assumption = z.output<typeof assumption>;
export type CheckResult = z.output<typeof checkResult>;

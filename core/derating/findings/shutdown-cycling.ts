import type { FindingRule } from '../finding-context.ts';

/** A shorted or overheated regulator that would cycle in its thermal shutdown. */
export const shutdownCycling: FindingRule = ({ conditions }) =>
  conditions.flatMap(({ condition, result }) =>
    result.regulators
      .filter((regulator) => regulator.shutsDown)
      .map((regulator) => ({
        rule: 'shutdown-cycling',
        severity: 'warn' as const,
        ref: regulator.ref,
        condition: condition.name,
        message: `${regulator.ref} reaches its thermal shutdown and cycles; its heat is taken as the mean that holds the junction there.`,
        remedy: 'Limit the fault current (foldback) or the time of the fault.',
      })),
  );

import { isShorted } from '#core/electrical/output-currents.ts';
import { formatNumber } from '#core/format.ts';
import type { FindingRule } from '../finding-context.ts';

/** A regulator that reaches its thermal shutdown: in its own short circuit it cycles there, else it would switch off. */
export const shutdownCycling: FindingRule = ({ board, conditions }) =>
  conditions.flatMap(({ condition, result }) =>
    result.regulators
      .filter((regulator) => regulator.shutsDown)
      .map((regulator) => {
        const part = board.parts[board.regulators.find(({ ref }) => ref === regulator.ref)?.part ?? ''];
        const reaches = `${regulator.ref} reaches its thermal shutdown at ${formatNumber(part?.shutdownC, 0)} °C`;
        const place = {
          rule: 'shutdown-cycling',
          severity: 'warn' as const,
          ref: regulator.ref,
          condition: condition.name,
        };
        return isShorted(condition, regulator)
          ? {
              ...place,
              message: `${reaches} and cycles; its heat is taken as the mean that holds the junction there.`,
              remedy: 'Limit the fault current (foldback) or the time of the fault.',
            }
          : {
              ...place,
              message: `${reaches} in operation; the figures are those without the shutdown, which would switch its load off.`,
              remedy: 'Lower its heat or spread it; a shutdown protects the die and is no operating point.',
            };
      }),
  );

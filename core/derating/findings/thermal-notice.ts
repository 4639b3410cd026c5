import type { FindingRule } from '../finding-context.ts';

/** What the thermal solution says about its range of validity. */
export const thermalNotice: FindingRule = ({ conditions }) =>
  conditions.flatMap(({ condition, notices }) =>
    notices.map((notice) => ({
      rule: notice.code,
      severity: notice.code.endsWith('off-board') ? ('stop' as const) : ('note' as const),
      ref: notice.ref,
      condition: condition.name,
      message: notice.message,
      remedy: notice.code.endsWith('off-board')
        ? 'Place it on the board.'
        : 'Treat the numbers of this condition with care.',
    })),
  );

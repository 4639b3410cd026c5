import type { FindingRule } from '../finding-context.ts';

/** No condition at all, or only one where the worst corner needs company. */
export const conditionCount: FindingRule = ({ board }) => {
  if (board.conditions.length === 0) {
    return [
      {
        rule: 'no-condition',
        severity: 'stop',
        ref: null,
        condition: null,
        message: 'There is no operating condition, so nothing is evaluated.',
        remedy: 'Add the worst corner: highest input, load and ambient, least air.',
      },
    ];
  }
  if (board.conditions.length > 1 || board.regulators.length === 0) return [];
  return [
    {
      rule: 'one-condition',
      severity: 'warn',
      ref: null,
      condition: null,
      message: 'Only one operating condition is checked.',
      remedy: 'Add the other corners (lowest input, altitude, stopped fan, shorted output) or say why one is enough.',
    },
  ];
};

import type { CheckResult } from '#core/result/result.ts';
import { junctionLimit } from '#core/record/governing.ts';

const head = [
  'condition',
  'regulator',
  'dissipation W',
  'junction °C',
  'uncertainty K',
  'limit °C',
  'margin K',
  'input V',
  'output A',
  'headroom V',
  'verdict',
];

/** The matrix as CSV (RFC 4180, decimal point, unrounded); a text that a spreadsheet would take for a formula is defused. */
export function matrixCsv(result: CheckResult): string {
  const rows = result.conditions.flatMap((condition) =>
    condition.regulators.map((regulator) => {
      const limit = junctionLimit(regulator);
      return [
        condition.name,
        regulator.ref,
        regulator.dissipationW,
        regulator.junctionC,
        regulator.uncertaintyK,
        limit?.limit ?? null,
        limit?.margin ?? null,
        regulator.inputV,
        regulator.outputA,
        regulator.headroomV,
        regulator.verdict,
      ];
    }),
  );
  return [head, ...rows].map((row) => row.map(cell).join(',')).join('\r\n') + '\r\n';
}

function cell(value: string | number | null): string {
  if (value === null) return '';
  if (typeof value === 'number') return String(value);
  const safe = /^[=+\-@\t\r]/.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

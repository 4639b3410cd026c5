import type { Board } from '#core/board/document.ts';
import { formatNumber } from '#core/format.ts';
import type { CheckResult, ConditionResult, RegulatorResult } from '#core/result/result.ts';

const number = formatNumber;

/** A result for people: one table a condition, then findings, cautions and what was assumed. */
export function resultTable(board: Board, result: CheckResult): string {
  const lines = [
    `${result.title || board.title}: ${result.verdict}`,
    `method ${result.method}, input ${result.inputHash}`,
    '',
  ];
  for (const condition of result.conditions) lines.push(...conditionLines(condition), '');
  lines.push(
    ...section(
      'Findings',
      result.findings.map((finding) => `[${finding.severity}] ${place(finding)}${finding.message} ${finding.remedy}`),
    ),
  );
  lines.push(
    ...section(
      'Cautions',
      result.cautions.map((caution) => `CAUTION ${place(caution)}${caution.message}`),
    ),
  );
  lines.push(
    ...section(
      'Assumed where the document says nothing',
      result.assumptions.map(({ path, value }) => `${path} = ${JSON.stringify(value)}`),
    ),
  );
  return `${lines.join('\n').trimEnd()}\n`;
}

const place = ({ condition }: { condition: string | null }) => (condition ? `${condition}: ` : '');

const section = (heading: string, lines: readonly string[]) =>
  lines.length > 0 ? [heading, ...lines.map((line) => `  ${line}`), ''] : [];

function conditionLines(condition: ConditionResult): string[] {
  const lines = [`${condition.name}: ${condition.verdict}${condition.message ? ` (${condition.message})` : ''}`];
  if (condition.regulators.length > 0) lines.push(...table(regulatorHead, condition.regulators.map(regulatorRow)));
  if (condition.sources.length > 0) {
    lines.push(
      ...table(
        ['source', 'heat W', 'mean °C', 'max °C', 'limit °C', 'verdict'],
        condition.sources.map((source) => [
          source.ref,
          number(source.powerW, 3),
          number(source.temperatureC, 1),
          number(source.maxC, 1),
          number(source.limitC, 1),
          source.limitC === null ? 'no limit' : source.verdict,
        ]),
      ),
    );
  }
  if (condition.probes.length > 0) {
    lines.push(
      ...table(
        ['probe', '°C'],
        condition.probes.map((probe) => [probe.id, number(probe.temperatureC, 2)]),
      ),
    );
  }
  const { board, energy, solver } = condition;
  if (board && energy && solver) {
    lines.push(
      `  board up to ${number(board.maxC, 1)} °C at ${number(board.maxAt[0], 1)}, ${number(board.maxAt[1], 1)} mm, mean ${number(board.meanC, 1)} °C`,
      `  ${solver.cells} unknowns of ${number(solver.cellMm, 2)} mm, ${solver.iterations} iterations, residual ${solver.residual.toExponential(1)}, ` +
        `heat in ${number(energy.inW, 3)} W, out ${number(energy.outW, 3)} W, grid error ${number(solver.gridErrorK, 2)} K, ${solver.milliseconds} ms`,
    );
  }
  return lines;
}

const regulatorHead = [
  'regulator',
  'heat W',
  'junction °C',
  '± K',
  'limit °C',
  'margin K',
  'case °C',
  'land °C',
  'θJA K/W',
  'Vin V',
  'Iout A',
  'headroom V',
  'verdict',
];

function regulatorRow(regulator: RegulatorResult): string[] {
  const junction = regulator.limits
    .filter((limit) => limit.quantity === 'junctionC' && limit.limit !== null)
    .reduce<number | null>((least, limit) => (least === null ? limit.limit : Math.min(least, limit.limit!)), null);
  const margin = junction === null || regulator.junctionC === null ? null : junction - regulator.junctionC;
  return [
    regulator.ref,
    number(regulator.dissipationW, 3),
    number(regulator.junctionC, 1),
    number(regulator.uncertaintyK, 1),
    number(junction, 1),
    number(margin, 1),
    number(regulator.caseTopC, 1),
    number(regulator.landC, 1),
    number(regulator.thetaJaKPerW, 1),
    number(regulator.inputV, 2),
    number(regulator.outputA, 3),
    number(regulator.headroomV, 2),
    regulator.verdict +
      (regulator.shutsDown ? ', shuts down' : regulator.regulating === false ? ', out of regulation' : ''),
  ];
}

/** Columns as wide as their widest entry; numbers to the right, the first and last column to the left. */
function table(head: readonly string[], rows: readonly (readonly string[])[]): string[] {
  const widths = head.map((title, k) => Math.max(title.length, ...rows.map((row) => row[k]!.length)));
  const line = (row: readonly string[]) =>
    `  ${row.map((cell, k) => (k === 0 || k === row.length - 1 ? cell.padEnd(widths[k]!) : cell.padStart(widths[k]!))).join('  ')}`.trimEnd();
  return [line(head), `  ${widths.map((width) => '─'.repeat(width)).join('  ')}`, ...rows.map(line)];
}

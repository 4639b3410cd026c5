import type { Board } from '#core/board/document.ts';
import { formatNumber } from '#core/format.ts';
import type { CheckResult, ConditionResult } from '#core/result/result.ts';
import { railLines } from './rail-lines.ts';
import { regulatorLines } from './regulator-lines.ts';
import { textTable } from './text-table.ts';

const number = formatNumber;

/** A result for people: one table a condition, then findings, cautions and what was assumed. */
export function resultTable(board: Board, result: CheckResult): string {
  const lines = [
    `${result.title || board.title}: ${result.verdict}`,
    `method ${result.method}, input ${result.inputHash}`,
    '',
  ];
  for (const condition of result.conditions) lines.push(...conditionLines(board, condition), '');
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

function conditionLines(sketch: Board, condition: ConditionResult): string[] {
  const lines = [`${condition.name}: ${condition.verdict}${condition.message ? ` (${condition.message})` : ''}`];
  const stated = sketch.conditions.find(({ name }) => name === condition.name);
  if (stated) lines.push(...railLines(sketch, stated));
  lines.push(...regulatorLines(condition));
  if (condition.sources.length > 0) {
    lines.push(
      ...textTable(
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
      ...textTable(
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

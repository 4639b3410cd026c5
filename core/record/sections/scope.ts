import type { Board } from '#core/board/document.ts';
import type { CheckResult } from '#core/result/result.ts';
import { quantityWords } from '../limit-words.ts';
import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

/** What was checked, and everything that was not: open points can hide nowhere else. */
export function scopeSection({ board, result, revision }: RecordInput): RecordSection {
  const open = [
    ...conditionsNotChecked(board, result),
    ...notEvaluated(result),
    ...limitless(board),
    ...(revision?.comments ?? [])
      .filter(({ resolvedBy }) => resolvedBy === null)
      .map(({ author }) => `A comment by ${author} is open (section “Findings”).`),
  ];
  return {
    id: 'scope',
    title: 'Scope and what was not evaluated',
    blocks: [
      {
        kind: 'pairs',
        rows: [
          ['Regulators', board.regulators.map(({ ref }) => ref).join(', ') || 'none'],
          ['Other sources of heat', board.sources.map(({ ref }) => ref).join(', ') || 'none'],
          ['Conditions checked', result.conditions.map(({ name }) => name).join('; ') || 'none'],
          ['Board', `${board.stackup.copper.length} copper layers; laminate, bodies and air as stated below`],
        ],
      },
      { kind: 'heading', text: 'Not evaluated, and open points' },
      open.length > 0
        ? { kind: 'list', items: open }
        : { kind: 'text', text: 'Nothing: every regulator was judged against every limit in every condition.' },
    ],
  };
}

function conditionsNotChecked(board: Board, result: CheckResult): string[] {
  if (board.conditions.length === 0) return ['There is no operating condition, so nothing was evaluated.'];
  return board.conditions
    .filter(({ name }) => !result.conditions.some((condition) => condition.name === name))
    .map(({ name }) => `Condition “${name}” is in the document but was not checked.`);
}

function notEvaluated(result: CheckResult): string[] {
  return result.conditions.flatMap((condition) => {
    if (condition.status !== 'converged')
      return [`Condition “${condition.name}” has no converged solution: ${condition.message ?? condition.status}`];
    return condition.regulators.flatMap(({ ref, limits, verdict }) => {
      const missing = limits.filter((limit) => limit.verdict === 'not evaluated');
      if (missing.length > 0) {
        const words = [...new Set(missing.map(({ quantity }) => quantityWords[quantity].toLowerCase()))].join(', ');
        return [`${ref} in “${condition.name}”: ${words} not evaluated.`];
      }
      return verdict === 'not evaluated' ? [`${ref} in “${condition.name}”: no verdict.`] : [];
    });
  });
}

function limitless(board: Board): string[] {
  const refs = board.sources.filter(({ limitC }) => limitC === null).map(({ ref }) => ref);
  const judged = board.criteria.rules.some(({ quantity }) => quantity === 'junctionC');
  return [
    ...(board.regulators.length === 0
      ? ['The board has no regulator: its heat was solved, but nothing was derated.']
      : []),
    ...(refs.length > 0 ? [`No temperature limit is stated for ${refs.join(', ')}: heated, but not judged.`] : []),
    ...(judged || board.regulators.length === 0
      ? []
      : ['The criteria hold no rule for the junction temperature, so no regulator can be within.']),
  ];
}

import type { Rule, RuleQuantity } from '#core/board/criteria.ts';
import { formatGiven } from '#core/format.ts';

type Mark = NonNullable<Rule['mark']>;

export const quantityWords: Record<RuleQuantity, string> = {
  junctionC: 'Junction temperature',
  inputV: 'Input voltage',
  outputA: 'Output current',
};

export const markWords: Record<Mark, string> = {
  read: 'read there',
  'second-hand': 'second-hand',
  'common-practice': 'common practice',
  house: 'house rule',
  unverified: 'unverified',
};

export const markMeanings: Record<Mark, string> = {
  read: 'the value was read in the document itself.',
  'second-hand': 'the value is quoted by another public text.',
  'common-practice': 'the value is usual in the trade; no single document stands for it.',
  house: 'the value is set by the team itself.',
  unverified: 'the value could not be checked; read the document before relying on it.',
};

/** Comparisons of a rule in words; the lowest limit counts. */
export function comparisons(rule: Rule): string[] {
  return [
    rule.atMostC === undefined ? '' : `at most ${formatGiven(rule.atMostC, '°C')}`,
    rule.belowMaxK === undefined ? '' : `${formatGiven(rule.belowMaxK, 'K')} below the maker’s maximum`,
    rule.ratio === undefined ? '' : `at most ${formatGiven(rule.ratio * 100, '%')} of the rated value`,
  ].filter(Boolean);
}

/** Document, revision, clause and level in one line. */
export function citation(rule: Rule): string {
  const parts = [
    rule.document,
    rule.revision && `revision ${rule.revision}`,
    rule.clause && `clause ${rule.clause}`,
    rule.level && `level ${rule.level}`,
  ].filter(Boolean);
  return parts.length > 0 ? parts.join(', ') : 'no document';
}

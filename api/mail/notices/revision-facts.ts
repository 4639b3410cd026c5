import { formatChange, formatQuantity } from '#core/format.ts';
import type { CheckResult, Verdict } from '#core/result/result.ts';

/** What a notice about a revision is made from. */
export type RevisionFacts = {
  recipient: string;
  actor: string;
  /** "PCA-0617 revision B". */
  revision: string;
  title: string;
  result: CheckResult | null;
  /** Address of the revision, without the page below it. */
  page: string;
};

const order: readonly Verdict[] = ['over', 'not evaluated', 'close', 'within'];

/** "2 over, 1 close, 5 within (regulators by condition)" and the hottest junction with its margin, in two lines. */
export function resultLines(result: CheckResult | null): string {
  if (!result) return 'There is no result for this sketch yet.';
  const all = result.conditions.flatMap((condition) =>
    condition.regulators.map((regulator) => ({ ...regulator, condition: condition.name })),
  );
  const counts = order
    .map((verdict) => ({ verdict, count: all.filter((regulator) => regulator.verdict === verdict).length }))
    .filter(({ count }) => count > 0)
    .map(({ verdict, count }) => `${count} ${verdict}`);
  const verdicts = `Verdicts, regulators by condition: ${counts.join(', ') || 'none'}.`;
  const [hottest] = all
    .filter((regulator) => regulator.junctionC !== null)
    .sort((a, b) => (b.junctionC ?? 0) - (a.junctionC ?? 0));
  if (!hottest) return verdicts;
  const limit = hottest.limits.find(({ quantity }) => quantity === 'junctionC');
  const margin = limit ? `, margin ${formatChange(limit.margin, 'K')}` : ', no limit stated';
  const junction = formatQuantity(hottest.junctionC, '°C');
  return `${verdicts}\nHottest: ${hottest.ref} at ${junction} in “${hottest.condition}”${margin}.`;
}

import type { CheckResult, Finding } from '#core/result/result.ts';

/** A reason given at submission for one `warn` finding. */
export type FindingReason = { rule: string; ref: string | null; condition: string | null; reason: string };

export type GuardFailure = { code: string; message: string };

export type GuardInput = {
  /** Stored result of exactly the sketch that is acted on; null when there is none. */
  result: CheckResult | null;
  reasons: readonly FindingReason[];
  openComments: number;
};

export function sameFinding(
  a: Pick<Finding, 'rule' | 'ref' | 'condition'>,
  b: Pick<Finding, 'rule' | 'ref' | 'condition'>,
) {
  return a.rule === b.rule && a.ref === b.ref && a.condition === b.condition;
}

/** What keeps a sketch from being submitted; empty when nothing does. */
export function submitGuards({ result, reasons }: GuardInput): GuardFailure[] {
  if (!result) return [noResult];
  const bare = result.findings.filter(
    (finding) => finding.severity === 'warn' && !reasons.some((reason) => sameFinding(reason, finding)),
  );
  return [
    ...stops(result),
    ...notConverged(result),
    ...bare.map((finding) => ({
      code: 'reason-missing',
      message: `Give a reason for “${finding.message}” or mend it.`,
    })),
  ];
}

/** What keeps a revision from being cleared or issued; an exceedance does, as no deviation has been agreed. */
export function clearGuards(input: GuardInput): GuardFailure[] {
  const { result, openComments } = input;
  if (!result) return [noResult];
  const failures = [...stops(result), ...notConverged(result)];
  if (result.verdict === 'over')
    failures.push({
      code: 'over-limit',
      message: 'At least one part is over its derated limit. Send the revision back.',
    });
  if (result.verdict === 'not evaluated')
    failures.push({ code: 'not-evaluated', message: 'Not every part was evaluated; a missing input is never a pass.' });
  if (openComments > 0)
    failures.push({ code: 'comments-open', message: `${openComments} comment(s) are not resolved yet.` });
  return failures;
}

const noResult: GuardFailure = {
  code: 'result-missing',
  message: 'There is no result for this sketch yet. Run the check first.',
};

function stops(result: CheckResult): GuardFailure[] {
  return result.findings
    .filter((finding) => finding.severity === 'stop')
    .map((finding) => ({ code: 'stop-finding', message: `${finding.message} ${finding.remedy}` }));
}

function notConverged(result: CheckResult): GuardFailure[] {
  return result.conditions
    .filter((condition) => condition.status !== 'converged')
    .map((condition) => ({
      code: 'not-converged',
      message: `Condition “${condition.name}” has no converged solution.`,
    }));
}

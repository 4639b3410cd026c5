import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { CheckResult, Finding } from '#core/result/result.ts';
import { paths } from '#web/paths.ts';
import { Notice } from '#web/ui/notice.tsx';

type Props = {
  result: CheckResult;
  revisionId: string;
  /** Shown below a finding, such as the reason given for it. */
  below?: (finding: Finding) => ReactNode;
};

/** Cautions first, then findings with place and remedy, then what was assumed. */
export function FindingsView({ result, revisionId, below }: Props) {
  return (
    <>
      <section aria-label="Cautions" className="border-t border-line-strong pt-4">
        <h2 className="mb-3 text-lg font-semibold">Cautions</h2>
        <div className="flex flex-col gap-2">
          {result.cautions.map((caution) => (
            <Notice key={`${caution.kind} ${caution.ref} ${caution.condition}`} tone="caution" title={placeOf(caution)}>
              {caution.message}
            </Notice>
          ))}
        </div>
      </section>
      <section aria-label="Findings" className="border-t border-line-strong pt-4">
        <h2 className="mb-3 text-lg font-semibold">Findings</h2>
        {result.findings.length === 0 ? <p className="text-ink-soft">Nothing was found wrong or doubtful.</p> : null}
        <div className="flex flex-col gap-2">
          {result.findings.map((finding) => (
            <Notice
              key={`${finding.rule} ${finding.ref} ${finding.condition} ${finding.message}`}
              tone={finding.severity}
              title={finding.message}
              action={
                <Link
                  className="text-sm underline underline-offset-4"
                  to={paths.sketch(revisionId, { select: finding.ref, condition: finding.condition })}
                >
                  {placeOf(finding)} on the sketch
                </Link>
              }
            >
              {finding.remedy}
              {below?.(finding)}
            </Notice>
          ))}
        </div>
      </section>
      <section aria-label="Assumptions" className="border-t border-line-strong pt-4">
        <details>
          <summary className="min-h-6 cursor-pointer text-lg font-semibold">
            Assumed where nothing was stated ({result.assumptions.length})
          </summary>
          <ul className="mt-2 text-sm sm:columns-2">
            {result.assumptions.map(({ path, value }) => (
              <li key={path} className="break-words">
                {path} = {JSON.stringify(value)}
              </li>
            ))}
          </ul>
        </details>
      </section>
    </>
  );
}

function placeOf({ ref, condition }: { ref: string | null; condition: string | null }): string {
  return [ref, condition].filter(Boolean).join(', ') || 'Whole board';
}

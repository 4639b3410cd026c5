import { Link } from 'react-router-dom';
import type { RevisionView } from '#core/contract/assemblies.ts';
import type { StoredResult } from '#core/contract/solving.ts';
import { formatQuantity } from '#core/format.ts';
import { governingByRegulator, junctionLimit } from '#core/record/governing.ts';
import type { CheckResult, Verdict } from '#core/result/result.ts';
import { paths } from '#web/paths.ts';
import { Timestamp } from '#web/ui/timestamp.tsx';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';

const meanings = {
  authored: 'Authored and submitted',
  reviewed: 'Reviewed and cleared',
  released: 'Released',
} as const;
const verdicts: readonly Verdict[] = ['over', 'not evaluated', 'close', 'within'];

/** Verdicts in numbers, the tightest junction, who drew it and who has signed. */
export function ReviewHead({ revision, stored }: { revision: RevisionView; stored: StoredResult | null }) {
  return (
    <section aria-label="What is reviewed" className="grid gap-8 lg:grid-cols-2">
      <div>
        <h2 className="mb-2 text-lg font-semibold">Verdict</h2>
        {stored ? (
          <Summary result={stored.result} upToDate={stored.upToDate} />
        ) : (
          <p>The sketch has not been checked yet.</p>
        )}
        <p className="mt-2 flex flex-wrap gap-x-5 text-sm">
          <Link className="underline underline-offset-4" to={paths.results(revision.id)}>
            Results in full
          </Link>
          <Link className="underline underline-offset-4" to={paths.sketch(revision.id)}>
            Sketch
          </Link>
          <Link className="underline underline-offset-4" to={paths.conditions(revision.id)}>
            Conditions
          </Link>
        </p>
      </div>
      <div>
        <h2 className="mb-2 text-lg font-semibold">People</h2>
        <dl className="text-sm">
          <Line label="Drawn by">{revision.authors.map(({ name }) => name).join(', ') || 'nobody yet'}</Line>
          {revision.signatures.map((signature) => (
            <Line key={signature.meaning} label={meanings[signature.meaning]}>
              {signature.name}, <Timestamp at={signature.signedAt} />
            </Line>
          ))}
          {revision.stateReason ? (
            <Line label={revision.state === 'withdrawn' ? 'Withdrawn because' : 'Sent back because'}>
              {revision.stateReason}
            </Line>
          ) : null}
        </dl>
      </div>
    </section>
  );
}

function Line({ label, children }: { label: string; children: React.ReactNode }) {
  return (
    <div className="grid grid-cols-[12rem_1fr] gap-3 border-b border-line py-1.5">
      <dt className="text-ink-soft">{label}</dt>
      <dd className="break-words">{children}</dd>
    </div>
  );
}

function Summary({ result, upToDate }: { result: CheckResult; upToDate: boolean }) {
  const governing = [...governingByRegulator(result).values()];
  const margin = (regulator: (typeof governing)[number]['regulator']) => junctionLimit(regulator)?.margin ?? Infinity;
  const tightest = governing.toSorted((a, b) => margin(a.regulator) - margin(b.regulator))[0];
  return (
    <>
      <ul className="flex flex-wrap gap-x-6 gap-y-1">
        {verdicts.map((verdict) => {
          const count = governing.filter(({ regulator }) => regulator.verdict === verdict).length;
          return count > 0 ? (
            <li key={verdict}>
              {count} <VerdictMark verdict={verdict} />
            </li>
          ) : null;
        })}
        {governing.length === 0 ? <li>No regulator was evaluated.</li> : null}
      </ul>
      {tightest && tightest.regulator.junctionC !== null ? (
        <p className="mt-1">
          Tightest: {tightest.regulator.ref} at {formatQuantity(tightest.regulator.junctionC, '°C')} ±{' '}
          {formatQuantity(tightest.regulator.uncertaintyK, 'K')} in “{tightest.condition.name}”, margin{' '}
          {formatQuantity(junctionLimit(tightest.regulator)?.margin, 'K')}.
        </p>
      ) : null}
      {upToDate ? null : <p className="mt-1 border-l-4 border-close pl-3">This check belongs to an earlier sketch.</p>}
    </>
  );
}

import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { governingByRegulator } from '#core/record/governing.ts';
import { useRevision } from '#web/revision/revision-context.ts';
import { resultQuery, sketchQuery } from '#web/revision/revision-queries.ts';
import { RunCheck } from '#web/revision/run-check.tsx';
import { paths } from '#web/paths.ts';
import { Empty } from '#web/ui/empty.tsx';
import { Loading } from '#web/ui/loading.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { Link } from 'react-router-dom';
import { ConditionDetail } from './condition-detail.tsx';
import { Downloads } from './downloads.tsx';
import { FindingsView } from './findings-view.tsx';
import { Matrix } from './matrix.tsx';
import { RegulatorDetail } from './regulator-detail.tsx';

const nothingToSave = async () => {};

/** Results of the stored check: matrix, the chosen cell in full, ledger, heat, findings. Choices live in the address. */
export function Component() {
  const revision = useRevision();
  const stored = useQuery(resultQuery(revision.id));
  const sketch = useQuery(sketchQuery(revision.id));
  const [search, setSearch] = useSearchParams();
  const runCheck = (
    <RunCheck
      revisionId={revision.id}
      maySolve={revision.allowed.includes('solve')}
      dirty={false}
      flush={nothingToSave}
    />
  );
  const error = stored.error ?? sketch.error;
  if (error) return <ProblemNotice error={error} retry={() => void stored.refetch()} />;
  if (stored.data === undefined || !sketch.data) return <Loading what="the results" />;
  if (stored.data === null) {
    return (
      <Empty title="Not checked yet" action={runCheck}>
        The server’s check of the saved sketch is the one that counts for review and record. It has not run for this
        revision yet.
      </Empty>
    );
  }
  const { result, upToDate } = stored.data;
  const refs = result.conditions[0]?.regulators.map(({ ref }) => ref) ?? [];
  const ref = refs.find((candidate) => candidate === search.get('select')) ?? refs[0] ?? null;
  const named = result.conditions.find(({ name }) => name === search.get('condition'));
  const condition =
    named ?? (ref ? governingByRegulator(result).get(ref)?.condition : undefined) ?? result.conditions[0];
  const choose = (next: { select?: string; condition: string }) =>
    setSearch({ ...(ref && { select: ref }), ...next }, { replace: true, preventScrollReset: true });
  return (
    <div className="flex flex-col gap-10">
      <div className="flex flex-wrap items-center justify-between gap-4">
        {runCheck}
        <Downloads revision={revision} result={result} />
      </div>
      {upToDate ? null : (
        <p className="border-l-4 border-close pl-3">
          The sketch has changed since this check. Run the check again before you submit.
        </p>
      )}
      {result.conditions.length === 0 ? (
        <Empty title="No operating condition">
          Nothing was evaluated.{' '}
          <Link className="underline underline-offset-4" to={paths.conditions(revision.id)}>
            Add the worst corner
          </Link>{' '}
          first.
        </Empty>
      ) : null}
      <Matrix result={result} chosen={{ ref, condition: condition?.name ?? null }} onChoose={choose} />
      {condition && ref ? (
        <RegulatorDetail result={result} condition={condition} reference={ref} board={sketch.data.board} />
      ) : null}
      {condition ? (
        <ConditionDetail
          revisionId={revision.id}
          solvedAt={stored.data.solvedAt}
          condition={condition}
          conditions={result.conditions}
          board={sketch.data.board}
          upToDate={upToDate}
          onChoose={(name) => choose({ condition: name })}
        />
      ) : null}
      <FindingsView result={result} revisionId={revision.id} />
    </div>
  );
}

import { useInfiniteQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import { auditKinds } from '#core/review/audit-kinds.ts';
import { paths } from '#web/paths.ts';
import { Button } from '#web/ui/button.tsx';
import { Empty } from '#web/ui/empty.tsx';
import { Loading } from '#web/ui/loading.tsx';
import { Page } from '#web/ui/page.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { SelectField } from '#web/ui/select-field.tsx';
import { auditQuery } from './audit-query.ts';
import { EventsTable } from './events-table.tsx';
import { eventWords } from './event-words.ts';

export function Component() {
  const [search, setSearch] = useSearchParams();
  const kind = search.get('kind') ?? '';
  const revisionId = search.get('revision') ?? '';
  const audit = useInfiniteQuery(auditQuery({ ...(kind && { kind }), ...(revisionId && { revisionId }) }));
  const events = audit.data?.pages.flatMap((page) => page.items) ?? [];
  const filter = (next: { kind?: string; revision?: string }) =>
    setSearch(
      Object.fromEntries(Object.entries({ kind, revision: revisionId, ...next }).filter(([, value]) => value)),
      { replace: true },
    );

  return (
    <Page title="Audit">
      <p className="-mt-4 mb-6 max-w-prose text-ink-soft">
        What happened in the team, newest first. Entries are written together with the change they tell of and cannot be
        altered or removed.
      </p>
      <div className="mb-6 flex flex-wrap items-end gap-4">
        <div className="w-full max-w-xs">
          <SelectField
            label="Kind of event"
            value={kind}
            onChange={(value) => filter({ kind: value })}
            options={[
              { value: '', label: 'Every kind' },
              ...auditKinds.map((value) => ({ value, label: eventWords(value) })),
            ]}
          />
        </div>
        {revisionId ? (
          <p className="flex min-h-10 items-center gap-3">
            <span>
              Of{' '}
              <Link className="underline underline-offset-4 hover:text-copper" to={paths.review(revisionId)}>
                one revision
              </Link>{' '}
              only
            </span>
            <Button size="small" onClick={() => filter({ revision: '' })}>
              Show all
            </Button>
          </p>
        ) : null}
      </div>
      {audit.error && !audit.data ? (
        <ProblemNotice error={audit.error} retry={() => void audit.refetch()} />
      ) : !audit.data ? (
        <Loading what="the audit trail" />
      ) : events.length === 0 ? (
        <Empty
          title="No event"
          action={kind || revisionId ? <Button onClick={() => setSearch({})}>Show every event</Button> : null}
        >
          {kind || revisionId
            ? 'Nothing in the trail matches the filter.'
            : 'Nothing has happened in this team yet. The first change is written here.'}
        </Empty>
      ) : (
        <>
          <EventsTable events={events} onRevision={(revision) => filter({ revision })} />
          <div className="mt-6 flex items-center gap-4">
            {audit.hasNextPage ? (
              <Button onClick={() => void audit.fetchNextPage()} disabled={audit.isFetchingNextPage}>
                {audit.isFetchingNextPage ? 'Loading …' : 'Show earlier events'}
              </Button>
            ) : (
              <p className="text-sm text-ink-soft">This is the beginning of the trail.</p>
            )}
          </div>
          {audit.error ? <ProblemNotice error={audit.error} retry={() => void audit.fetchNextPage()} /> : null}
        </>
      )}
    </Page>
  );
}

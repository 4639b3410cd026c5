import { useQuery } from '@tanstack/react-query';
import { Link, NavLink, Outlet, useLocation, useMatches, useParams } from 'react-router-dom';
import { paths } from '#web/paths.ts';
import { useDocumentTitle } from '#web/ui/document-title.ts';
import { Icon } from '#web/ui/icon.tsx';
import { Loading } from '#web/ui/loading.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { StateMark } from '#web/ui/state-mark.tsx';
import { tabClass } from '#web/ui/tab-class.ts';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';
import { nextStep } from './next-step.ts';
import { resultQuery, revisionQuery } from './revision-queries.ts';

const views = [
  { view: 'sketch', label: 'Sketch' },
  { view: 'conditions', label: 'Conditions' },
  { view: 'rails', label: 'Rails' },
  { view: 'results', label: 'Results' },
  { view: 'review', label: 'Review' },
  { view: 'record', label: 'Record' },
] as const;

/** Frame of the six pages of a revision; hands the revision down (`useRevision`). */
export function Component() {
  const { revisionId = '' } = useParams();
  const { pathname, search } = useLocation();
  const fills = useMatches().some(({ handle }) => typeof handle === 'object' && handle !== null && 'fill' in handle);
  const revision = useQuery(revisionQuery(revisionId));
  const result = useQuery(resultQuery(revisionId));
  const current = views.find(({ view }) => pathname.endsWith(`/${view}`));
  const name = revision.data ? `${revision.data.assembly.number} ${revision.data.letter}` : 'Revision';
  useDocumentTitle(current ? `${current.label} · ${name}` : name);

  if (!revision.data) {
    return (
      <div className="mx-auto w-full max-w-[60rem] px-4 py-8 sm:px-8">
        {revision.error ? (
          <ProblemNotice error={revision.error} retry={() => void revision.refetch()} />
        ) : (
          <Loading what="the revision" />
        )}
      </div>
    );
  }
  const { assembly, letter, state, openComments } = revision.data;
  const step = nextStep(revision.data);
  const condition = new URLSearchParams(search).get('condition');
  return (
    <>
      <div className="border-b border-line px-4 pt-3 sm:px-8 print:border-0">
        <div className="flex flex-wrap items-baseline gap-x-5 gap-y-1">
          <h1 className="text-lg tracking-tight">
            <Link
              to={paths.assembly(assembly.id)}
              className="underline decoration-line-strong underline-offset-4 hover:text-copper"
            >
              {assembly.number}
            </Link>{' '}
            <span title={`Revision ${letter}`}>{letter}</span>
            <span className="ml-3 font-normal text-ink-soft">{assembly.title}</span>
          </h1>
          <span className="text-sm">
            <StateMark state={state} />
          </span>
          {result.data ? (
            <span className="inline-flex items-baseline gap-2 text-sm">
              <VerdictMark verdict={result.data.result.verdict} />
              {result.data.upToDate ? null : <span className="text-ink-soft">of an earlier sketch</span>}
            </span>
          ) : (
            <span className="text-sm text-ink-soft">{result.data === null ? 'Not checked yet' : null}</span>
          )}
          <Link
            to={paths[step.view](revisionId)}
            className="inline-flex min-h-6 items-center gap-1.5 text-sm hover:text-copper sm:ml-auto print:hidden"
          >
            {step.text}
            <Icon name="arrowRight" size={14} />
          </Link>
        </div>
        <nav aria-label={`Revision ${letter}`} className="relative flex gap-4 overflow-x-auto sm:gap-6 print:hidden">
          {views.map(({ view, label }) => (
            <NavLink key={view} to={paths[view](revisionId, { condition })} className={tabClass}>
              {label}
              {view === 'review' && openComments > 0 ? (
                <span className="text-sm font-normal">
                  {openComments} <span className="sr-only">open comments</span>
                </span>
              ) : null}
            </NavLink>
          ))}
        </nav>
      </div>
      {fills ? (
        <div className="flex min-h-0 min-w-0 flex-1 flex-col">
          <Outlet context={revision.data} />
        </div>
      ) : (
        <div className="mx-auto w-full max-w-[90rem] min-w-0 px-4 py-6 sm:px-8">
          <Outlet context={revision.data} />
        </div>
      )}
    </>
  );
}

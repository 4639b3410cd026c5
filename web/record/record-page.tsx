import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { stateWords } from '#core/record/state-words.ts';
import { paths } from '#web/paths.ts';
import { useRevision } from '#web/revision/revision-context.ts';
import { commentsQuery, resultQuery, sketchQuery } from '#web/revision/revision-queries.ts';
import { addressOf } from '#web/server/call.ts';
import { buttonClass } from '#web/ui/button-class.ts';
import { Empty } from '#web/ui/empty.tsx';
import { Loading } from '#web/ui/loading.tsx';
import { Notice } from '#web/ui/notice.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { RecordSections } from './record-sections.tsx';

const papers = [
  ['a4', 'A4'],
  ['letter', 'Letter'],
] as const;

/** The derating record on screen, and its PDF. */
export function Component() {
  const revision = useRevision();
  const stored = useQuery(resultQuery(revision.id));
  const sketch = useQuery(sketchQuery(revision.id));
  const comments = useQuery(commentsQuery(revision.id));
  const error = stored.error ?? sketch.error ?? comments.error;
  if (error) return <ProblemNotice error={error} />;
  if (stored.data === undefined || !sketch.data || !comments.data) return <Loading what="the record" />;
  if (!stored.data?.upToDate) {
    return (
      <Empty
        title="No record yet"
        action={
          <Link className={buttonClass({})} to={paths.results(revision.id)}>
            Run the check
          </Link>
        }
      >
        A record is printed from the stored result of exactly this sketch, and there is none yet.
      </Empty>
    );
  }
  const frozen = revision.state === 'issued' || revision.state === 'superseded';
  const address = (paper: string) =>
    addressOf('/revisions/{revisionId}/record.pdf', { revisionId: revision.id }, { paper });
  return (
    <div className="flex flex-col gap-8">
      <div className="flex flex-wrap items-center gap-3 print:hidden">
        {papers.map(([paper, word]) => (
          <a
            key={paper}
            href={address(paper)}
            className={buttonClass({ variant: paper === 'a4' ? 'primary' : 'plain' })}
            download
          >
            Derating record, PDF, {word}
          </a>
        ))}
        {revision.allowed.includes('issue') ? (
          <Link className={buttonClass({})} to={paths.review(revision.id)}>
            Issue it on the page Review
          </Link>
        ) : null}
      </div>
      <Notice
        tone="note"
        title={
          frozen
            ? `${stateWords[revision.state]}: nothing in it can change any more`
            : `${stateWords[revision.state]}: every page of the PDF says so`
        }
      >
        {frozen
          ? 'Printing it again gives the same bytes.'
          : 'It can be printed at any time; only an issued record stands for a release.'}{' '}
        Content {stored.data.result.inputHash}, method {stored.data.result.method}.
      </Notice>
      <RecordSections
        revision={revision}
        board={sketch.data.board}
        result={stored.data.result}
        comments={comments.data.items}
        solvedAt={stored.data.solvedAt}
      />
    </div>
  );
}

import { useQuery } from '@tanstack/react-query';
import { useRevision } from '#web/revision/revision-context.ts';
import { commentsQuery, resultQuery } from '#web/revision/revision-queries.ts';
import { FindingsView } from '#web/results/findings-view.tsx';
import { Loading } from '#web/ui/loading.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { sameFinding } from '#core/review/guards.ts';
import { Comments } from './comments.tsx';
import { Decision } from './decision.tsx';
import { ReviewHead } from './review-head.tsx';

/** What is reviewed, what was found and why it was left, what people say, and the decision. */
export function Component() {
  const revision = useRevision();
  const stored = useQuery(resultQuery(revision.id));
  const comments = useQuery(commentsQuery(revision.id));
  const error = stored.error ?? comments.error;
  if (error) return <ProblemNotice error={error} />;
  if (stored.data === undefined || !comments.data) return <Loading what="the review" />;
  const result = stored.data?.upToDate ? stored.data.result : null;
  return (
    <div className="flex flex-col gap-10">
      <ReviewHead revision={revision} stored={stored.data} />
      <Decision revision={revision} result={result} />
      <Comments revision={revision} comments={comments.data.items} result={result} />
      {result ? (
        <FindingsView
          result={result}
          revisionId={revision.id}
          below={(finding) => {
            const given = revision.reasons.find((reason) => sameFinding(reason, finding));
            return given ? <p className="mt-1 border-l-2 border-copper pl-2">Reason given: {given.reason}</p> : null;
          }}
        />
      ) : null}
    </div>
  );
}

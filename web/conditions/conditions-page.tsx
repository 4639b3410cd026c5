import { useQuery } from '@tanstack/react-query';
import { useRevision } from '#web/revision/revision-context.ts';
import { sketchQuery } from '#web/revision/revision-queries.ts';
import { sessionQuery } from '#web/session/session-query.ts';
import { Loading } from '#web/ui/loading.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { ConditionsForm } from './conditions-form.tsx';

/** Rails, conditions and criteria of a revision; opens with what the server holds now. */
export function Component() {
  const revision = useRevision();
  const session = useQuery(sessionQuery);
  const sketch = useQuery({
    ...sketchQuery(revision.id),
    refetchOnMount: 'always',
    refetchOnWindowFocus: false,
    refetchOnReconnect: false,
  });
  if (sketch.error && !sketch.data) {
    return <ProblemNotice error={sketch.error} retry={() => void sketch.refetch()} />;
  }
  if (!sketch.data || !sketch.isFetchedAfterMount || !session.data) return <Loading what="the conditions" />;
  return <ConditionsForm key={revision.id} revision={revision} sketch={sketch.data} userId={session.data.member.id} />;
}

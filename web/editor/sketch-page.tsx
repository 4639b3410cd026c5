import { useQuery } from '@tanstack/react-query';
import { useRevision } from '#web/revision/revision-context.ts';
import { sketchQuery } from '#web/revision/revision-queries.ts';
import { sessionQuery } from '#web/session/session-query.ts';
import { Loading } from '#web/ui/loading.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { Editor } from './page/editor.tsx';

/** Sketch page of a revision; opens with what the server holds now, never with what an earlier visit left behind. */
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
    return (
      <div className="p-8">
        <ProblemNotice error={sketch.error} retry={() => void sketch.refetch()} />
      </div>
    );
  }
  if (!sketch.data || !sketch.isFetchedAfterMount || !session.data) {
    return (
      <div className="px-8">
        <Loading what="the sketch" />
      </div>
    );
  }
  return <Editor key={revision.id} revision={revision} sketch={sketch.data} userId={session.data.member.id} />;
}

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { toast } from 'sonner';
import { jobQuery, resultQuery, revisionQuery } from '#web/revision/revision-queries.ts';
import { call } from '#web/server/call.ts';
import { announce } from '#web/ui/announce.ts';
import { Button } from '#web/ui/button.tsx';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';
import { verdictWords } from '#web/ui/verdict-words.ts';
import { timeText } from '#web/editor/saving/time-text.ts';

type Props = {
  revisionId: string;
  maySolve: boolean;
  /** Whether the page holds changes that are not saved. */
  dirty: boolean;
  /** Saves them. */
  flush: () => Promise<void>;
};

/** The server's check of the saved sketch: the number that counts for review and record. */
export function RunCheck({ revisionId, maySolve, dirty, flush }: Props) {
  const client = useQueryClient();
  const [jobId, setJobId] = useState<string | null>(null);
  const stored = useQuery(resultQuery(revisionId));
  const job = useQuery({ ...jobQuery(revisionId, jobId ?? ''), enabled: jobId !== null });
  const start = useMutation({
    mutationFn: async () => {
      await flush();
      return call('solve', { params: { revisionId } });
    },
    onSuccess: ({ id }) => setJobId(id),
    onError: (error) => toast.error('The check was not started', { description: error.message }),
  });
  const cancel = useMutation({
    mutationFn: (id: string) => call('cancelJob', { params: { revisionId, jobId: id } }),
    onSettled: () => void job.refetch(),
  });
  const state = job.data?.state;

  useEffect(() => {
    if (state === undefined || state === 'waiting' || state === 'running') return;
    if (state === 'failed') {
      toast.error('The check failed', { description: job.data?.message ?? 'The server gave no reason.' });
    }
    void client.invalidateQueries({ queryKey: revisionQuery(revisionId).queryKey });
    void client
      .fetchQuery({ ...resultQuery(revisionId), staleTime: 0 })
      .then((result) => state === 'done' && result && announce(`Check stored: ${verdictWords[result.result.verdict]}`));
  }, [state, client, revisionId, job.data?.message]);

  const isRunning = state === undefined || state === 'waiting' || state === 'running';
  if (jobId !== null && isRunning) {
    return (
      <div className="flex items-center gap-3 text-sm" role="status">
        <span>
          {state === 'running'
            ? `Checking, ${job.data?.done ?? 0} of ${job.data?.total ?? '?'} conditions`
            : 'Check queued'}
        </span>
        <Button size="small" onClick={() => cancel.mutate(jobId)} disabled={cancel.isPending}>
          Cancel
        </Button>
      </div>
    );
  }
  return (
    <div className="flex flex-wrap items-center gap-x-3 gap-y-1 text-sm">
      {stored.data ? (
        <span className="inline-flex flex-wrap items-center gap-x-2">
          <span className="text-ink-soft">Stored check, {timeText(stored.data.solvedAt)}:</span>
          <VerdictMark verdict={stored.data.result.verdict} />
          {stored.data.upToDate && !dirty ? null : <span className="text-ink-soft">of an earlier sketch</span>}
        </span>
      ) : (
        <span className="text-ink-soft">{stored.data === null ? 'No stored check' : null}</span>
      )}
      {maySolve ? (
        <Button
          size="small"
          variant="primary"
          disabled={start.isPending}
          title="Saves the sketch and stores the server’s result; that result counts for review and record"
          onClick={() => start.mutate()}
        >
          Run check
        </Button>
      ) : null}
    </div>
  );
}

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import type { RevisionView } from '#core/contract/assemblies.ts';
import type { CommentView } from '#core/contract/review.ts';
import type { CheckResult } from '#core/result/result.ts';
import { revisionKey } from '#web/revision/revision-queries.ts';
import { call } from '#web/server/call.ts';
import { newKey } from '#web/server/new-key.ts';
import { Button } from '#web/ui/button.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { SelectField } from '#web/ui/select-field.tsx';
import { TextAreaField } from '#web/ui/text-area-field.tsx';
import { Timestamp } from '#web/ui/timestamp.tsx';

type Props = { revision: RevisionView; comments: readonly CommentView[]; result: CheckResult | null };

/** Comments on the revision or on one object; an open one keeps it from being cleared. */
export function Comments({ revision, comments, result }: Props) {
  const client = useQueryClient();
  const refresh = () => client.invalidateQueries({ queryKey: revisionKey(revision.id) });
  const resolve = useMutation({
    mutationFn: (commentId: string) => call('resolveComment', { params: { revisionId: revision.id, commentId } }),
    onSuccess: refresh,
  });
  const mayComment = revision.allowed.includes('comment');
  return (
    <section aria-label="Comments" className="border-t border-line-strong pt-4">
      <h2 className="mb-3 text-lg font-semibold">Comments</h2>
      {comments.length === 0 ? <p className="mb-3 text-ink-soft">Nobody has commented yet.</p> : null}
      <ul className="mb-4 flex flex-col">
        {comments.map((comment) => (
          <li key={comment.id} className="border-b border-line py-3">
            <p className="text-sm text-ink-soft">
              <span className="font-semibold text-ink">{comment.author}</span>, <Timestamp at={comment.createdAt} />
              {comment.place ? ` · on ${comment.place.id}` : ''}
            </p>
            <p className="max-w-prose break-words whitespace-pre-wrap">{comment.text}</p>
            {comment.resolvedAt ? (
              <p className="text-sm text-ink-soft">
                Resolved by {comment.resolvedBy}, <Timestamp at={comment.resolvedAt} />
              </p>
            ) : mayComment ? (
              <Button
                size="small"
                className="mt-1"
                disabled={resolve.isPending}
                onClick={() => resolve.mutate(comment.id)}
              >
                Resolve <span className="sr-only">the comment of {comment.author}</span>
              </Button>
            ) : (
              <p className="text-sm font-semibold">Open</p>
            )}
          </li>
        ))}
      </ul>
      {resolve.error ? <ProblemNotice error={resolve.error} /> : null}
      {mayComment ? <CommentForm revision={revision} result={result} onAdded={refresh} /> : null}
    </section>
  );
}

function CommentForm({
  revision,
  result,
  onAdded,
}: Pick<Props, 'revision' | 'result'> & { onAdded: () => Promise<void> }) {
  const [text, setText] = useState('');
  const [place, setPlace] = useState('');
  // Kept until the server has answered, so that a repeated try is the same comment.
  const [key, setKey] = useState(newKey);
  const [first] = result?.conditions ?? [];
  const regulators = first?.regulators.map(({ ref }) => ref) ?? [];
  const sources = first?.sources.map(({ ref }) => ref) ?? [];
  const add = useMutation({
    mutationFn: () => {
      const kind = regulators.includes(place) ? ('regulator' as const) : ('source' as const);
      const body = { text: text.trim(), place: place === '' ? null : { kind, id: place } };
      return call('comment', { params: { revisionId: revision.id }, body, idempotencyKey: key });
    },
    onSuccess: async () => {
      setText('');
      setKey(newKey());
      await onAdded();
    },
  });
  return (
    <form
      aria-label="Comment"
      onSubmit={(event) => {
        event.preventDefault();
        add.mutate();
      }}
      className="flex max-w-2xl flex-col gap-3"
    >
      <TextAreaField
        label="Your comment"
        rows={3}
        maxLength={4000}
        value={text}
        onChange={(event) => setText(event.target.value)}
      />
      <div className="w-64">
        <SelectField
          label="About"
          value={place}
          options={[
            { value: '', label: 'the revision' },
            ...[...regulators, ...sources].map((ref) => ({ value: ref, label: ref })),
          ]}
          onChange={setPlace}
        />
      </div>
      {add.error ? <ProblemNotice error={add.error} /> : null}
      <div>
        <Button type="submit" disabled={add.isPending || text.trim() === ''}>
          Comment
        </Button>
      </div>
    </form>
  );
}

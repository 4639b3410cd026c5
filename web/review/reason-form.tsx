import { useState } from 'react';
import type { RevisionView } from '#core/contract/assemblies.ts';
import { call } from '#web/server/call.ts';
import { Button } from '#web/ui/button.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { TextAreaField } from '#web/ui/text-area-field.tsx';
import { useDecide } from './use-decide.ts';

type Props = {
  revision: RevisionView;
  endpoint: 'sendBack' | 'withdraw';
  title: string;
  label: string;
  danger?: boolean;
};

/** A change of state that needs a reason; the reason is kept and mailed. */
export function ReasonForm({ revision, endpoint, title, label, danger = false }: Props) {
  const [reason, setReason] = useState('');
  const name = `${revision.assembly.number} ${revision.letter}`;
  const decide = useDecide(
    revision.id,
    endpoint === 'sendBack' ? `${name} is sent back` : `${name} is withdrawn`,
    (given: string) =>
      call(endpoint, { params: { revisionId: revision.id }, ifMatch: revision.version, body: { reason: given } }),
  );
  return (
    <form
      aria-label={title}
      onSubmit={(event) => {
        event.preventDefault();
        decide.mutate(reason.trim());
      }}
      className="flex max-w-md flex-col gap-3"
    >
      <TextAreaField
        label={label}
        rows={3}
        required
        maxLength={2000}
        value={reason}
        onChange={(event) => setReason(event.target.value)}
      />
      {decide.error ? <ProblemNotice error={decide.error} /> : null}
      <div>
        <Button type="submit" variant={danger ? 'danger' : 'plain'} disabled={decide.isPending || reason.trim() === ''}>
          {title} {name}
        </Button>
      </div>
    </form>
  );
}

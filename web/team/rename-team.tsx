import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type FormEvent, useId, useState } from 'react';
import { toast } from 'sonner';
import { renameTeamBody } from '#core/contract/people.ts';
import { call } from '#web/server/call.ts';
import { sessionKey } from '#web/session/session-query.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { fieldErrors, serverFault } from '#web/ui/form-error.ts';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { TextField } from '#web/ui/text-field.tsx';
import { teamQuery } from './team-queries.ts';

export function RenameTeam({ name: present, onClose }: { name: string; onClose: () => void }) {
  const formId = useId();
  const client = useQueryClient();
  const [name, setName] = useState(present);
  const [error, setError] = useState<string | undefined>();
  const rename = useMutation({
    mutationFn: () => call('renameTeam', { body: { name } }),
    onSuccess: async () => {
      await Promise.all([
        client.invalidateQueries({ queryKey: teamQuery.queryKey }),
        client.invalidateQueries({ queryKey: sessionKey }),
      ]);
      toast.success('Team renamed');
      onClose();
    },
  });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const found = fieldErrors(renameTeamBody, { name }).name;
    setError(found);
    if (!found) rename.mutate();
  };
  return (
    <Dialog
      title="Rename the team"
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      footer={
        <>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" form={formId} variant="primary" disabled={rename.isPending}>
            {rename.isPending ? 'Saving …' : 'Save'}
          </Button>
        </>
      }
    >
      <form id={formId} noValidate onSubmit={submit} className="flex flex-col gap-5">
        {rename.error ? <ProblemNotice error={rename.error} fields={['name']} /> : null}
        <TextField
          label="Name"
          autoComplete="off"
          value={name}
          onChange={(event) => setName(event.target.value)}
          error={error ?? serverFault(rename.error, 'name')}
        />
      </form>
    </Dialog>
  );
}

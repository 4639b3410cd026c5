import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useId, useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { toast } from 'sonner';
import type { z } from 'zod';
import { inviteBody } from '#core/contract/people.ts';
import { call } from '#web/server/call.ts';
import { newKey } from '#web/server/new-key.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { sentence, serverFault } from '#web/ui/form-error.ts';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { TextField } from '#web/ui/text-field.tsx';
import { RolesField } from './roles-field.tsx';
import { invitationsQuery } from './team-queries.ts';

type Invite = z.input<typeof inviteBody>;

/** Sends an invitation by mail. */
export function InviteDialog({ onClose }: { onClose: () => void }) {
  const formId = useId();
  const client = useQueryClient();
  const [key] = useState(newKey);
  const form = useForm<Invite>({
    resolver: zodResolver(inviteBody),
    defaultValues: { name: '', email: '', roles: [] },
  });
  const { errors } = form.formState;
  const invite = useMutation({
    mutationFn: (body: Invite) => call('invite', { body, idempotencyKey: key }),
    onSuccess: async (invitation) => {
      await client.invalidateQueries({ queryKey: invitationsQuery.queryKey });
      toast.success(`${invitation.name} is invited`, { description: `A link went to ${invitation.email}.` });
      onClose();
    },
  });
  const errorAt = (field: 'name' | 'email') => {
    const message = errors[field]?.message;
    if (message) return form.getValues(field).trim() === '' ? 'Cannot be left empty.' : sentence(message);
    return serverFault(invite.error, field);
  };
  return (
    <Dialog
      title="Invite a member"
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      footer={
        <>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" form={formId} variant="primary" disabled={invite.isPending}>
            {invite.isPending ? 'Sending …' : 'Send the invitation'}
          </Button>
        </>
      }
    >
      <form
        id={formId}
        noValidate
        onSubmit={(event) => void form.handleSubmit((body) => invite.mutate(body))(event)}
        className="flex flex-col gap-5"
      >
        {invite.error ? <ProblemNotice error={invite.error} fields={['name', 'email']} /> : null}
        <TextField label="Name" autoComplete="off" {...form.register('name')} error={errorAt('name')} />
        <TextField
          label="E-mail address"
          type="email"
          autoComplete="off"
          spellCheck={false}
          {...form.register('email')}
          error={errorAt('email')}
        />
        <Controller
          control={form.control}
          name="roles"
          render={({ field }) => (
            <RolesField
              value={field.value}
              onChange={field.onChange}
              error={errors.roles ? 'Choose at least one role.' : undefined}
            />
          )}
        />
      </form>
    </Dialog>
  );
}

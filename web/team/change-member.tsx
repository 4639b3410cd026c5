import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type FormEvent, useId, useState } from 'react';
import { toast } from 'sonner';
import { changeMemberBody, type MemberView } from '#core/contract/people.ts';
import { call } from '#web/server/call.ts';
import { sessionKey } from '#web/session/session-query.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { type FieldErrors, fieldErrors, serverFault } from '#web/ui/form-error.ts';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { TextField } from '#web/ui/text-field.tsx';
import { RolesField } from './roles-field.tsx';
import { membersQuery } from './team-queries.ts';

/** Change of a member's name and roles. */
export function ChangeMember({ member, onClose }: { member: MemberView; onClose: () => void }) {
  const formId = useId();
  const client = useQueryClient();
  const [values, setValues] = useState({ name: member.name, roles: member.roles });
  const [errors, setErrors] = useState<FieldErrors>({});
  const change = useMutation({
    mutationFn: () => call('changeMember', { params: { memberId: member.id }, body: values }),
    onSuccess: async () => {
      await Promise.all([
        client.invalidateQueries({ queryKey: membersQuery.queryKey }),
        client.invalidateQueries({ queryKey: sessionKey }),
      ]);
      toast.success(`${values.name} changed`);
      onClose();
    },
  });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const found = fieldErrors(changeMemberBody, values);
    if (found.roles) found.roles = 'Choose at least one role.';
    setErrors(found);
    if (Object.keys(found).length === 0) change.mutate();
  };
  return (
    <Dialog
      title={`Change ${member.name}`}
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      footer={
        <>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" form={formId} variant="primary" disabled={change.isPending}>
            {change.isPending ? 'Saving …' : 'Save'}
          </Button>
        </>
      }
    >
      <form id={formId} noValidate onSubmit={submit} className="flex flex-col gap-5">
        {change.error ? <ProblemNotice error={change.error} fields={['name', 'roles']} /> : null}
        <TextField
          label="Name"
          autoComplete="off"
          value={values.name}
          onChange={(event) => setValues({ ...values, name: event.target.value })}
          error={errors.name ?? serverFault(change.error, 'name')}
        />
        <RolesField
          value={values.roles}
          onChange={(roles) => setValues({ ...values, roles })}
          error={errors.roles ?? serverFault(change.error, 'roles')}
        />
      </form>
    </Dialog>
  );
}

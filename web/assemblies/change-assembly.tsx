import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type FormEvent, useId, useState } from 'react';
import { toast } from 'sonner';
import { type AssemblyView, changeAssemblyBody } from '#core/contract/assemblies.ts';
import { call } from '#web/server/call.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { type FieldErrors, fieldErrors, serverFault } from '#web/ui/form-error.ts';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { TextField } from '#web/ui/text-field.tsx';
import { assembliesKey } from './assembly-queries.ts';

/** Change of number and title of an assembly. */
export function ChangeAssembly({ assembly, onClose }: { assembly: AssemblyView; onClose: () => void }) {
  const formId = useId();
  const client = useQueryClient();
  const [values, setValues] = useState({ number: assembly.number, title: assembly.title });
  const [errors, setErrors] = useState<FieldErrors>({});
  const change = useMutation({
    mutationFn: () => call('changeAssembly', { params: { assemblyId: assembly.id }, body: values }),
    onSuccess: async () => {
      await Promise.all([
        client.invalidateQueries({ queryKey: assembliesKey }),
        client.invalidateQueries({ queryKey: ['revision'] }),
      ]);
      toast.success('Assembly changed');
      onClose();
    },
  });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const found = fieldErrors(changeAssemblyBody, values);
    setErrors(found);
    if (Object.keys(found).length === 0) change.mutate();
  };
  return (
    <Dialog
      title={`Change ${assembly.number}`}
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
        {change.error ? <ProblemNotice error={change.error} fields={['number', 'title']} /> : null}
        <TextField
          label="Number"
          autoComplete="off"
          value={values.number}
          onChange={(event) => setValues({ ...values, number: event.target.value })}
          error={errors.number ?? serverFault(change.error, 'number')}
        />
        <TextField
          label="Title"
          autoComplete="off"
          value={values.title}
          onChange={(event) => setValues({ ...values, title: event.target.value })}
          error={errors.title ?? serverFault(change.error, 'title')}
        />
      </form>
    </Dialog>
  );
}

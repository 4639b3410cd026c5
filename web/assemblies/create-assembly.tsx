import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type FormEvent, useId, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { createAssemblyBody } from '#core/contract/assemblies.ts';
import { paths } from '#web/paths.ts';
import { call } from '#web/server/call.ts';
import { newKey } from '#web/server/new-key.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { type FieldErrors, fieldErrors, serverFault } from '#web/ui/form-error.ts';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { TextField } from '#web/ui/text-field.tsx';
import { assembliesKey } from './assembly-queries.ts';

/** Number and title of a new assembly; opens the sketch of its revision A. */
export function CreateAssembly({ onClose }: { onClose: () => void }) {
  const formId = useId();
  const client = useQueryClient();
  const navigate = useNavigate();
  const [key] = useState(newKey);
  const [values, setValues] = useState({ number: '', title: '' });
  const [errors, setErrors] = useState<FieldErrors>({});
  const create = useMutation({
    mutationFn: () => call('createAssembly', { body: values, idempotencyKey: key }),
    onSuccess: async (assembly) => {
      await client.invalidateQueries({ queryKey: assembliesKey });
      const first = assembly.revisions[0];
      await navigate(first ? paths.sketch(first.id) : paths.assembly(assembly.id));
    },
  });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const found = fieldErrors(createAssemblyBody, values);
    setErrors(found);
    if (Object.keys(found).length === 0) create.mutate();
  };
  return (
    <Dialog
      title="New assembly"
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      footer={
        <>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" form={formId} variant="primary" disabled={create.isPending}>
            {create.isPending ? 'Creating …' : 'Create'}
          </Button>
        </>
      }
    >
      <form id={formId} noValidate onSubmit={submit} className="flex flex-col gap-5">
        <p className="text-ink-soft">It starts as revision A with a blank board.</p>
        {create.error ? <ProblemNotice error={create.error} fields={['number', 'title']} /> : null}
        <TextField
          label="Number"
          hint="The drawing or part number of the assembly; one of its kind in the team."
          autoComplete="off"
          value={values.number}
          onChange={(event) => setValues({ ...values, number: event.target.value })}
          error={errors.number ?? serverFault(create.error, 'number')}
        />
        <TextField
          label="Title"
          autoComplete="off"
          value={values.title}
          onChange={(event) => setValues({ ...values, title: event.target.value })}
          error={errors.title ?? serverFault(create.error, 'title')}
        />
      </form>
    </Dialog>
  );
}

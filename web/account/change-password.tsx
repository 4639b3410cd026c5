import { useMutation } from '@tanstack/react-query';
import { type FormEvent, useState } from 'react';
import { toast } from 'sonner';
import { changePasswordBody } from '#core/contract/people.ts';
import { call } from '#web/server/call.ts';
import { Button } from '#web/ui/button.tsx';
import { type FieldErrors, fieldErrors, serverFault } from '#web/ui/form-error.ts';
import { PasswordField } from '#web/ui/password-field.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';

const blank = { currentPassword: '', newPassword: '' };

/** Change of the own password; ends every other session of the person. */
export function ChangePassword({ email }: { email: string }) {
  const [values, setValues] = useState(blank);
  const [errors, setErrors] = useState<FieldErrors>({});
  const change = useMutation({
    mutationFn: () => call('changePassword', { body: values }),
    onSuccess: () => {
      setValues(blank);
      toast.success('Password changed', { description: 'Every other session of yours has ended.' });
    },
  });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const found = fieldErrors(changePasswordBody, values);
    if (found.currentPassword) found.currentPassword = 'Enter your present password.';
    setErrors(found);
    if (Object.keys(found).length === 0) change.mutate();
  };
  return (
    <section aria-labelledby="password">
      <h2 id="password" className="text-xl">
        Change the password
      </h2>
      <form noValidate onSubmit={submit} className="mt-4 flex flex-col gap-5 border-t border-line pt-4">
        {change.error ? <ProblemNotice error={change.error} fields={['currentPassword', 'newPassword']} /> : null}
        <input type="hidden" name="username" autoComplete="username" value={email} />
        <PasswordField
          label="Present password"
          autoComplete="current-password"
          value={values.currentPassword}
          onChange={(event) => setValues({ ...values, currentPassword: event.target.value })}
          error={errors.currentPassword ?? serverFault(change.error, 'currentPassword')}
        />
        <PasswordField
          label="New password"
          hint="At least 12 characters; a few words in a row are fine."
          autoComplete="new-password"
          value={values.newPassword}
          onChange={(event) => setValues({ ...values, newPassword: event.target.value })}
          error={errors.newPassword ?? serverFault(change.error, 'newPassword')}
        />
        <Button type="submit" variant="primary" disabled={change.isPending} className="self-start">
          {change.isPending ? 'Changing …' : 'Change the password'}
        </Button>
      </form>
    </section>
  );
}

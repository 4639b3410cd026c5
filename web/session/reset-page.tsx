import { useMutation } from '@tanstack/react-query';
import { type FormEvent, useState } from 'react';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { newPassword } from '#core/contract/people.ts';
import { PlainPage } from '#web/layout/plain-page.tsx';
import { paths } from '#web/paths.ts';
import { call } from '#web/server/call.ts';
import { Button } from '#web/ui/button.tsx';
import { fieldErrors, serverFault } from '#web/ui/form-error.ts';
import { PasswordField } from '#web/ui/password-field.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';

export function Component() {
  const { token = '' } = useParams();
  const navigate = useNavigate();
  const [password, setPassword] = useState('');
  const [error, setError] = useState<string | undefined>();
  const complete = useMutation({
    mutationFn: () => call('completeReset', { body: { token, password } }),
    onSuccess: () => navigate(paths.signIn(), { replace: true, state: { passwordSet: true } }),
  });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const found = fieldErrors(newPassword, password)[''];
    setError(found);
    if (!found) complete.mutate();
  };
  return (
    <PlainPage title="Set a new password">
      <form noValidate onSubmit={submit} className="flex flex-col gap-5">
        {complete.error ? <ProblemNotice error={complete.error} fields={['password']} /> : null}
        <PasswordField
          label="New password"
          hint="At least 12 characters; a few words in a row are fine. Every open session ends."
          name="password"
          autoComplete="new-password"
          value={password}
          onChange={(event) => setPassword(event.target.value)}
          error={error ?? serverFault(complete.error, 'password')}
        />
        <Button type="submit" variant="primary" disabled={complete.isPending} className="self-start">
          {complete.isPending ? 'Setting …' : 'Set the password'}
        </Button>
      </form>
      <Link
        to={paths.passwordReset()}
        className="mt-6 inline-block py-1 underline underline-offset-4 hover:text-copper"
      >
        Ask for another link
      </Link>
    </PlainPage>
  );
}

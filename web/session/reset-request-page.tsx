import { useMutation } from '@tanstack/react-query';
import { type FormEvent, useState } from 'react';
import { Link } from 'react-router-dom';
import { requestResetBody } from '#core/contract/people.ts';
import { PlainPage } from '#web/layout/plain-page.tsx';
import { paths } from '#web/paths.ts';
import { call } from '#web/server/call.ts';
import { Button } from '#web/ui/button.tsx';
import { fieldErrors } from '#web/ui/form-error.ts';
import { Notice } from '#web/ui/notice.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { TextField } from '#web/ui/text-field.tsx';

export function Component() {
  const [email, setEmail] = useState('');
  const [error, setError] = useState<string | undefined>();
  const request = useMutation({ mutationFn: () => call('requestReset', { body: { email: email.trim() } }) });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const found = fieldErrors(requestResetBody, { email: email.trim() }).email;
    setError(found);
    if (!found) request.mutate();
  };
  return (
    <PlainPage title="Reset the password">
      {request.isSuccess ? (
        <Notice tone="note" title="Look into your mail">
          If {email.trim()} belongs to a member, a link to set a new password is on its way. It works once and for a
          limited time.
        </Notice>
      ) : (
        <form noValidate onSubmit={submit} className="flex flex-col gap-5">
          {request.error ? <ProblemNotice error={request.error} /> : null}
          <TextField
            label="E-mail address"
            hint="A link to set a new password is sent there."
            type="email"
            name="email"
            autoComplete="username"
            spellCheck={false}
            value={email}
            onChange={(event) => setEmail(event.target.value)}
            error={error}
          />
          <Button type="submit" variant="primary" disabled={request.isPending} className="self-start">
            {request.isPending ? 'Sending …' : 'Send the link'}
          </Button>
        </form>
      )}
      <Link to={paths.signIn()} className="mt-6 inline-block py-1 underline underline-offset-4 hover:text-copper">
        Back to sign-in
      </Link>
    </PlainPage>
  );
}

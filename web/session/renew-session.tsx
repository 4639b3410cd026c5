import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type FormEvent, useId, useState } from 'react';
import { call } from '#web/server/call.ts';
import { announce } from '#web/ui/announce.ts';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { PasswordField } from '#web/ui/password-field.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { sessionKey } from './session-query.ts';

/** A fresh session for the same member; the page behind stays as it is. */
export function RenewSession({ email, onClose }: { email: string; onClose: () => void }) {
  const formId = useId();
  const client = useQueryClient();
  const [password, setPassword] = useState('');
  const [error, setError] = useState<string | undefined>();
  const renew = useMutation({
    mutationFn: () => call('signIn', { body: { email, password } }),
    onSuccess: (session) => {
      client.setQueryData(sessionKey, session);
      announce('You stay signed in.');
      onClose();
    },
  });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setError(password === '' ? 'Enter your password.' : undefined);
    if (password !== '') renew.mutate();
  };
  return (
    <Dialog
      title="Stay signed in"
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      footer={
        <>
          <Button onClick={onClose}>Not now</Button>
          <Button type="submit" form={formId} variant="primary" disabled={renew.isPending}>
            {renew.isPending ? 'Signing in …' : 'Sign in again'}
          </Button>
        </>
      }
    >
      <form id={formId} noValidate onSubmit={submit} className="flex flex-col gap-5">
        {renew.error ? <ProblemNotice error={renew.error} /> : null}
        <p>The page stays as it is. You are signed in as {email}.</p>
        <input type="hidden" name="username" autoComplete="username" value={email} />
        <PasswordField
          label="Password"
          autoComplete="current-password"
          value={password}
          onChange={(event) => setPassword(event.target.value)}
          error={error}
        />
      </form>
    </Dialog>
  );
}

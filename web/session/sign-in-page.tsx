import { useMutation, useQuery } from '@tanstack/react-query';
import { type FormEvent, useState } from 'react';
import { Link, Navigate, useLocation, useSearchParams } from 'react-router-dom';
import { signInBody } from '#core/contract/people.ts';
import { PlainPage } from '#web/layout/plain-page.tsx';
import { paths, safeReturn } from '#web/paths.ts';
import { call } from '#web/server/call.ts';
import { Button } from '#web/ui/button.tsx';
import { type FieldErrors, fieldErrors } from '#web/ui/form-error.ts';
import { Notice } from '#web/ui/notice.tsx';
import { PasswordField } from '#web/ui/password-field.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { TextField } from '#web/ui/text-field.tsx';
import { useEnterSession } from './enter-session.ts';
import { sessionQuery } from './session-query.ts';

export function Component() {
  const [search] = useSearchParams();
  const target = safeReturn(search.get('to'));
  const { data: session } = useQuery(sessionQuery);
  const enter = useEnterSession();
  const [email, setEmail] = useState('');
  const [password, setPassword] = useState('');
  const [errors, setErrors] = useState<FieldErrors>({});
  const signIn = useMutation({
    mutationFn: () => call('signIn', { body: { email: email.trim(), password } }),
    onSuccess: (view) => enter(view, target),
  });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const found = fieldErrors(signInBody, { email: email.trim(), password });
    const told = {
      ...(found.email && { email: found.email }),
      ...(found.password && { password: 'Enter your password.' }),
    };
    setErrors(told);
    if (Object.keys(told).length === 0) signIn.mutate();
  };
  if (session && !signIn.isPending && !signIn.isSuccess) return <Navigate to={target} replace />;

  return (
    <PlainPage title="Sign in">
      <form noValidate onSubmit={submit} className="flex flex-col gap-5">
        <WhyHere />
        {signIn.error ? <ProblemNotice error={signIn.error} /> : null}
        <TextField
          label="E-mail address"
          type="email"
          name="email"
          autoComplete="username"
          spellCheck={false}
          value={email}
          onChange={(event) => setEmail(event.target.value)}
          error={errors.email}
        />
        <PasswordField
          label="Password"
          name="password"
          autoComplete="current-password"
          value={password}
          onChange={(event) => setPassword(event.target.value)}
          error={errors.password}
        />
        <div className="flex flex-wrap items-center justify-between gap-4">
          <Button type="submit" variant="primary" disabled={signIn.isPending}>
            {signIn.isPending ? 'Signing in …' : 'Sign in'}
          </Button>
          <Link to={paths.passwordReset()} className="inline-block py-1 underline underline-offset-4 hover:text-copper">
            Forgotten the password?
          </Link>
        </div>
      </form>
    </PlainPage>
  );
}

/** Tells somebody who did not come here by themselves why they see this page. */
function WhyHere() {
  const state: unknown = useLocation().state;
  const has = (key: string) => typeof state === 'object' && state !== null && key in state;
  if (has('ended')) {
    return (
      <Notice tone="note" title="Your session has ended">
        Sign in again; you return to the page you were on.
      </Notice>
    );
  }
  if (has('passwordSet')) return <Notice tone="note" title="The new password is set. Sign in with it." />;
  if (has('signedOut')) return <Notice tone="note" title="You are signed out." />;
  return null;
}

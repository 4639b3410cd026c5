import { useMutation, useQuery } from '@tanstack/react-query';
import { type FormEvent, useState } from 'react';
import { Link, useParams } from 'react-router-dom';
import { acceptInvitationBody } from '#core/contract/people.ts';
import { roleNames } from '#core/review/role.ts';
import { PlainPage } from '#web/layout/plain-page.tsx';
import { paths } from '#web/paths.ts';
import { call } from '#web/server/call.ts';
import { Button } from '#web/ui/button.tsx';
import { type FieldErrors, fieldErrors, serverFault } from '#web/ui/form-error.ts';
import { Loading } from '#web/ui/loading.tsx';
import { PasswordField } from '#web/ui/password-field.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { TextField } from '#web/ui/text-field.tsx';
import { useEnterSession } from './enter-session.ts';

export function Component() {
  const { token = '' } = useParams();
  const preview = useQuery({
    queryKey: ['invitation', token],
    queryFn: ({ signal }) => call('previewInvitation', { body: { token }, signal }),
    staleTime: Infinity,
  });
  return (
    <PlainPage title={preview.data ? `Join ${preview.data.team}` : 'Invitation'}>
      {preview.data ? (
        <AcceptForm token={token} invitedAs={preview.data} />
      ) : preview.error ? (
        <div className="flex flex-col items-start gap-5">
          <ProblemNotice error={preview.error} />
          <p className="text-ink-soft">
            An invitation works once and for a limited time. Ask the administrator of the team for a new one.
          </p>
          <Link to={paths.signIn()} className="py-1 underline underline-offset-4 hover:text-copper">
            Sign in
          </Link>
        </div>
      ) : (
        <Loading what="the invitation" />
      )}
    </PlainPage>
  );
}

type InvitedAs = { name: string; email: string; roles: (keyof typeof roleNames)[] };

function AcceptForm({ token, invitedAs }: { token: string; invitedAs: InvitedAs }) {
  const enter = useEnterSession();
  const [name, setName] = useState(invitedAs.name);
  const [password, setPassword] = useState('');
  const [errors, setErrors] = useState<FieldErrors>({});
  const accept = useMutation({
    mutationFn: () => call('acceptInvitation', { body: { token, name, password } }),
    onSuccess: (session) => enter(session, paths.assemblies()),
  });
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const found = fieldErrors(acceptInvitationBody, { token, name, password });
    setErrors(found);
    if (Object.keys(found).length === 0) accept.mutate();
  };
  return (
    <form noValidate onSubmit={submit} className="flex flex-col gap-5">
      <p>
        You are invited as {invitedAs.roles.map((role) => roleNames[role].toLowerCase()).join(', ')}. Your sign-in is{' '}
        <strong className="break-all">{invitedAs.email}</strong>.
      </p>
      {accept.error ? <ProblemNotice error={accept.error} fields={['name', 'password']} /> : null}
      <input type="hidden" name="username" autoComplete="username" value={invitedAs.email} />
      <TextField
        label="Your name"
        hint="As it is to stand in records and signatures."
        name="name"
        autoComplete="name"
        value={name}
        onChange={(event) => setName(event.target.value)}
        error={errors.name ?? serverFault(accept.error, 'name')}
      />
      <PasswordField
        label="Password"
        hint="At least 12 characters; a few words in a row are fine."
        name="password"
        autoComplete="new-password"
        value={password}
        onChange={(event) => setPassword(event.target.value)}
        error={errors.password ?? serverFault(accept.error, 'password')}
      />
      <Button type="submit" variant="primary" disabled={accept.isPending} className="self-start">
        {accept.isPending ? 'Joining …' : 'Join the team'}
      </Button>
    </form>
  );
}

import { useState } from 'react';
import type { RevisionView } from '#core/contract/assemblies.ts';
import { call } from '#web/server/call.ts';
import { Button } from '#web/ui/button.tsx';
import { PasswordField } from '#web/ui/password-field.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { useDecide } from './use-decide.ts';

type Props = { revision: RevisionView; endpoint: 'clear' | 'issue'; title: string; meaning: string; disabled: boolean };

/** A signature: its meaning in words, and the password once more. */
export function SignForm({ revision, endpoint, title, meaning, disabled }: Props) {
  const [password, setPassword] = useState('');
  const name = `${revision.assembly.number} ${revision.letter}`;
  const decide = useDecide(
    revision.id,
    endpoint === 'clear' ? `${name} is cleared` : `${name} is issued`,
    (given: string) =>
      call(endpoint, { params: { revisionId: revision.id }, ifMatch: revision.version, body: { password: given } }),
  );
  return (
    <form
      aria-label={title}
      onSubmit={(event) => {
        event.preventDefault();
        decide.mutate(password, { onSettled: () => setPassword('') });
      }}
      className="flex max-w-md flex-col gap-3"
    >
      <p className="text-sm">{meaning}</p>
      <PasswordField
        label="Your password, as signature"
        autoComplete="current-password"
        value={password}
        required
        disabled={disabled}
        onChange={(event) => setPassword(event.target.value)}
      />
      {decide.error ? <ProblemNotice error={decide.error} /> : null}
      <div>
        <Button type="submit" variant="primary" disabled={disabled || decide.isPending || password === ''}>
          {title} {name}
        </Button>
      </div>
    </form>
  );
}

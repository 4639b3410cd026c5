import { type ComponentProps, type ReactNode, useState } from 'react';
import { controlClass, Field } from './field.tsx';
import { Icon } from './icon.tsx';

type Props = {
  label: ReactNode;
  hint?: ReactNode | undefined;
  error?: string | undefined;
  /** Tells a password manager which password it is. */
  autoComplete: 'current-password' | 'new-password';
} & ComponentProps<'input'>;

/** Password with a button that shows what was typed; pasting and password managers work. */
export function PasswordField({ label, hint, error, ...input }: Props) {
  const [shown, setShown] = useState(false);
  return (
    <Field label={label} hint={hint} error={error}>
      {({ id, describedBy, invalid }) => (
        <div className="flex gap-2">
          <input
            {...input}
            id={id}
            type={shown ? 'text' : 'password'}
            spellCheck={false}
            autoCapitalize="none"
            aria-describedby={describedBy}
            aria-invalid={invalid || undefined}
            className={controlClass(invalid)}
          />
          <button
            type="button"
            aria-pressed={shown}
            aria-controls={id}
            onClick={() => setShown(!shown)}
            className="inline-flex min-h-10 w-24 shrink-0 items-center justify-center gap-2 rounded-sm border border-line-strong bg-panel text-sm font-semibold hover:border-ink"
          >
            <Icon name={shown ? 'eyeClosed' : 'eye'} />
            {shown ? 'Hide' : 'Show'} <span className="sr-only">password</span>
          </button>
        </div>
      )}
    </Field>
  );
}

import type { ComponentProps, ReactNode } from 'react';
import { classes } from './classes.ts';
import { controlClass, Field } from './field.tsx';

type Props = {
  label: ReactNode;
  hint?: ReactNode | undefined;
  error?: string | undefined;
  unit?: string | undefined;
} & ComponentProps<'input'>;

/** One line of text; takes what an input takes, so a form library can register it. */
export function TextField({ label, hint, error, unit, className, ...input }: Props) {
  return (
    <Field label={label} hint={hint} error={error} unit={unit}>
      {({ id, describedBy, invalid }) => (
        <input
          type="text"
          {...input}
          id={id}
          aria-describedby={describedBy}
          aria-invalid={invalid || undefined}
          className={classes(controlClass(invalid), className)}
        />
      )}
    </Field>
  );
}

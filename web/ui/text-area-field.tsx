import type { ComponentProps, ReactNode } from 'react';
import { classes } from './classes.ts';
import { controlClass, Field } from './field.tsx';

type Props = {
  label: ReactNode;
  hint?: ReactNode | undefined;
  error?: string | undefined;
} & ComponentProps<'textarea'>;

/** Several lines of text. */
export function TextAreaField({ label, hint, error, className, rows = 4, ...area }: Props) {
  return (
    <Field label={label} hint={hint} error={error}>
      {({ id, describedBy, invalid }) => (
        <textarea
          {...area}
          rows={rows}
          id={id}
          aria-describedby={describedBy}
          aria-invalid={invalid || undefined}
          className={classes(controlClass(invalid), 'py-2 leading-normal', className)}
        />
      )}
    </Field>
  );
}

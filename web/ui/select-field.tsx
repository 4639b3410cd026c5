import type { ReactNode } from 'react';
import { controlClass, Field } from './field.tsx';

type Props<V extends string> = {
  label: ReactNode;
  value: V;
  onChange: (value: V) => void;
  options: readonly { value: V; label: string; disabled?: boolean }[];
  hint?: ReactNode | undefined;
  error?: string | undefined;
  disabled?: boolean | undefined;
  name?: string;
};

/** One choice of a few; the browser's own list, so that keyboard, touch and type-ahead work everywhere. */
export function SelectField<V extends string>({
  label,
  value,
  onChange,
  options,
  hint,
  error,
  disabled,
  name,
}: Props<V>) {
  return (
    <Field label={label} hint={hint} error={error}>
      {({ id, describedBy, invalid }) => (
        <select
          id={id}
          name={name}
          value={value}
          disabled={disabled}
          aria-describedby={describedBy}
          aria-invalid={invalid || undefined}
          onChange={(event) => {
            const chosen = options.find((option) => option.value === event.target.value);
            if (chosen) onChange(chosen.value);
          }}
          className={controlClass(invalid)}
        >
          {options.map((option) => (
            <option key={option.value} value={option.value} disabled={option.disabled}>
              {option.label}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}

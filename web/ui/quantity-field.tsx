import { type KeyboardEvent, type ReactNode, useState } from 'react';
import { formatGiven } from '#core/format.ts';
import { controlClass, Field } from './field.tsx';
import { readQuantity } from './read-quantity.ts';
import { stepped } from './quantity-step.ts';

type Props = {
  label: ReactNode;
  unit: string;
  value: number | null;
  /** Called with a value inside the range, or with null where `optional`; never with what is not one. */
  onCommit: (value: number | null) => void;
  minimum: number;
  maximum: number;
  optional?: boolean | undefined;
  disabled?: boolean | undefined;
  hint?: ReactNode | undefined;
};

/**
 * Number with a unit. Enter or leaving the field commits, Escape restores, arrow keys step (Page keys by ten).
 * What cannot be taken stays as it was typed, with the range and unit said below.
 */
export function QuantityField({ label, unit, value, onCommit, minimum, maximum, optional, disabled, hint }: Props) {
  const [draft, setDraft] = useState<string | null>(null);
  const [error, setError] = useState<string | undefined>();
  const shown = draft ?? (value === null ? '' : String(Number(value.toPrecision(10))));

  const settle = (next: number | null) => {
    setDraft(null);
    setError(undefined);
    if (next !== value) onCommit(next);
  };
  const commit = () => {
    if (draft === null) return;
    if (draft.trim() === '' && optional) return settle(null);
    const read = draft.trim() === '' ? { error: 'Enter a number.' } : readQuantity(draft, unit);
    const range = `From ${formatGiven(minimum)} to ${formatGiven(maximum, unit)}.`;
    if ('error' in read) return setError(`${read.error} ${range}`);
    if (read.value < minimum || read.value > maximum) {
      return setError(`${formatGiven(read.value, unit)} is outside the range. ${range}`);
    }
    settle(read.value);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    const steps = { ArrowUp: 1, ArrowDown: -1, PageUp: 10, PageDown: -10 }[event.key];
    if (event.key === 'Enter') {
      commit();
    } else if (event.key === 'Escape' && draft !== null) {
      // Escape belongs to the field while it holds something to take back, not to the dialog around it.
      event.stopPropagation();
      event.preventDefault();
      setDraft(null);
      setError(undefined);
    } else if (steps !== undefined) {
      event.preventDefault();
      const read = readQuantity(shown, unit);
      if ('value' in read) settle(stepped(read.value, steps, unit, minimum, maximum));
    }
  };

  return (
    <Field label={label} hint={hint} error={error}>
      {({ id, describedBy, invalid }) => (
        <div className="relative">
          <input
            id={id}
            type="text"
            // Some keypads for decimals have no minus sign.
            inputMode={minimum < 0 ? 'text' : 'decimal'}
            autoComplete="off"
            spellCheck={false}
            value={shown}
            disabled={disabled}
            aria-invalid={invalid || undefined}
            aria-describedby={[unit ? `${id}-unit` : '', describedBy].filter(Boolean).join(' ') || undefined}
            onChange={(event) => setDraft(event.target.value)}
            onBlur={commit}
            onKeyDown={onKeyDown}
            className={controlClass(invalid)}
            style={{ paddingRight: `${unit.length * 0.55 + 1.4}em` }}
          />
          {unit ? (
            <span
              id={`${id}-unit`}
              className="pointer-events-none absolute inset-y-0 right-3 flex items-center text-sm text-ink-soft"
            >
              {unit}
            </span>
          ) : null}
        </div>
      )}
    </Field>
  );
}

import { type ReactNode, useId } from 'react';
import { classes } from './classes.ts';

export type FieldIds = { id: string; describedBy: string | undefined; invalid: boolean };
type Props = {
  label: ReactNode;
  hint?: ReactNode | undefined;
  error?: string | undefined;
  /** Shown behind the label; the control shows it too where it is typed. */
  unit?: string | undefined;
  children: (ids: FieldIds) => ReactNode;
};

/** Label above, hint, control, error below; `ids` ties the control to them. */
export function Field({ label, hint, error, unit, children }: Props) {
  const id = useId();
  const described = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ');
  return (
    <div className="flex min-w-0 flex-col gap-1">
      <label htmlFor={id} className="text-sm font-semibold">
        {label}
        {unit ? <span className="font-normal text-ink-soft"> in {unit}</span> : null}
      </label>
      {hint ? (
        <p id={`${id}-hint`} className="text-sm text-ink-soft">
          {hint}
        </p>
      ) : null}
      {children({ id, describedBy: described || undefined, invalid: Boolean(error) })}
      {error ? (
        <p id={`${id}-error`} className="text-sm font-semibold text-over">
          {error}
        </p>
      ) : null}
    </div>
  );
}

/** Look of every one-line control. */
export function controlClass(invalid: boolean): string {
  return classes(
    'min-h-10 w-full min-w-0 rounded-sm border bg-panel px-3 text-base text-ink',
    'disabled:border-line disabled:bg-paper disabled:text-ink-soft',
    invalid ? 'border-2 border-over' : 'border-line-strong',
  );
}

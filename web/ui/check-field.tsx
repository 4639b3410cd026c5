import { type ComponentProps, type ReactNode, useId } from 'react';

type Props = { label: ReactNode; hint?: ReactNode | undefined } & ComponentProps<'input'>;

/** A tick box with its label to the right; the whole line is the target. */
export function CheckField({ label, hint, ...input }: Props) {
  const id = useId();
  return (
    <div className="flex items-start gap-3 py-1">
      <input
        {...input}
        type="checkbox"
        id={id}
        aria-describedby={hint ? `${id}-hint` : undefined}
        className="mt-0.5 size-6 shrink-0 accent-copper"
      />
      <div className="min-w-0">
        <label htmlFor={id} className="block min-h-6">
          {label}
        </label>
        {hint ? (
          <p id={`${id}-hint`} className="text-sm text-ink-soft">
            {hint}
          </p>
        ) : null}
      </div>
    </div>
  );
}

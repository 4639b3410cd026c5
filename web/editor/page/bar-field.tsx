import { type ReactNode, useId } from 'react';

type Props<V extends string> = {
  label: string;
  value: V;
  onChange: (value: V) => void;
  options: readonly { value: V; label: string }[];
  disabled?: boolean;
};

const controlClass =
  'min-h-8 max-w-56 rounded-sm border border-line-strong bg-panel px-2 text-sm text-ink disabled:text-ink-soft';

/** Choice in a bar, its label to the left. */
export function BarSelect<V extends string>({ label, value, onChange, options, disabled }: Props<V>) {
  const id = useId();
  return (
    <span className="inline-flex items-center gap-2 text-sm">
      <label htmlFor={id} className="text-ink-soft">
        {label}
      </label>
      <select
        id={id}
        value={value}
        disabled={disabled}
        className={controlClass}
        onChange={(event) => {
          const chosen = options.find((option) => option.value === event.target.value);
          if (chosen) onChange(chosen.value);
        }}
      >
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </span>
  );
}

/** A tick box in a bar. */
export function BarCheck({
  label,
  checked,
  onChange,
}: {
  label: ReactNode;
  checked: boolean;
  onChange: (on: boolean) => void;
}) {
  return (
    <label className="inline-flex min-h-8 items-center gap-2 text-sm">
      <input
        type="checkbox"
        checked={checked}
        onChange={(event) => onChange(event.target.checked)}
        className="size-6 accent-copper"
      />
      {label}
    </label>
  );
}

import { useId } from 'react';
import { Icon } from '#web/ui/icon.tsx';

type Props = { value: string; count: number; total: number; onChange: (value: string) => void };

/** Filter over the list, with how much it leaves. */
export function SearchBox({ value, count, total, onChange }: Props) {
  const id = useId();
  return (
    <div role="search" className="mb-4 flex flex-wrap items-center gap-x-4 gap-y-2">
      <label htmlFor={id} className="sr-only">
        Find an assembly
      </label>
      <div className="relative w-full max-w-sm">
        <span className="pointer-events-none absolute inset-y-0 left-3 flex items-center text-ink-soft">
          <Icon name="search" />
        </span>
        <input
          id={id}
          type="search"
          autoComplete="off"
          value={value}
          placeholder="Number, title, state or verdict"
          onChange={(event) => onChange(event.target.value)}
          className="min-h-10 w-full rounded-sm border border-line-strong bg-panel pr-3 pl-9 placeholder:text-ink-soft"
        />
      </div>
      <p role="status" className="text-sm text-ink-soft">
        {count === total ? `${total} in all` : `${count} of ${total}`}
      </p>
    </div>
  );
}

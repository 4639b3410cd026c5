import type { ReactNode } from 'react';

type Props = { title: string; note?: ReactNode; action?: ReactNode; children: ReactNode };

/** A part of the page under a hairline, its one action beside the title. */
export function Section({ title, note, action, children }: Props) {
  return (
    <section aria-label={title} className="mb-10 border-t border-line-strong pt-4">
      <div className="mb-4 flex flex-wrap items-baseline justify-between gap-3">
        <div>
          <h2 className="text-lg font-semibold">{title}</h2>
          {note ? <p className="max-w-prose text-sm text-ink-soft">{note}</p> : null}
        </div>
        {action}
      </div>
      {children}
    </section>
  );
}

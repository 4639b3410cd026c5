import type { ReactNode } from 'react';

/** Name and value, line by line; a value that is not stated says so. */
export function Values({ values }: { values: readonly (readonly [string, ReactNode])[] }) {
  return (
    <dl className="mt-4 border-t border-line">
      {values.map(([name, value]) => (
        <div key={name} className="grid gap-x-6 border-b border-line py-2 sm:grid-cols-[15rem_1fr]">
          <dt className="text-ink-soft">{name}</dt>
          <dd className="min-w-0 break-words">
            {value === null || value === undefined || value === '' ? (
              <span className="text-ink-soft">not stated</span>
            ) : (
              value
            )}
          </dd>
        </div>
      ))}
    </dl>
  );
}

/** Where the values come from. */
export function Source({ children }: { children: string }) {
  return (
    <p className="mt-4 max-w-prose text-sm">
      <span className="text-ink-soft">Source: </span>
      {children}
    </p>
  );
}

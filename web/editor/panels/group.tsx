import type { ReactNode } from 'react';

/** A titled part of a panel: fields two abreast. */
export function Group({ title, children, note }: { title: string; children: ReactNode; note?: ReactNode }) {
  return (
    <fieldset className="border-b border-line px-4 py-3">
      <legend className="float-left mb-2 w-full text-sm font-semibold">{title}</legend>
      <div className="clear-both grid grid-cols-2 gap-x-3 gap-y-2.5 [&_input:not([type=checkbox])]:min-h-9 [&_input]:text-sm [&_label]:text-xs [&_p]:text-xs [&_select]:min-h-9 [&_select]:text-sm">
        {children}
      </div>
      {note ? <p className="mt-2 text-xs text-ink-soft">{note}</p> : null}
    </fieldset>
  );
}

/** A line of a group that takes its whole width. */
export function Wide({ children }: { children: ReactNode }) {
  return <div className="col-span-2 min-w-0">{children}</div>;
}

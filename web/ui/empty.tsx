import type { ReactNode } from 'react';

/** Nothing here yet: what it is, why it is empty, and the one next action. */
export function Empty({ title, children, action }: { title: string; children: ReactNode; action?: ReactNode }) {
  return (
    <div className="border-y border-line py-12">
      <div className="max-w-prose">
        <h2 className="text-xl">{title}</h2>
        <div className="mt-2 text-ink-soft">{children}</div>
        {action ? <div className="mt-6 flex flex-wrap gap-3">{action}</div> : null}
      </div>
    </div>
  );
}

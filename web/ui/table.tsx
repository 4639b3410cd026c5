import type { ComponentProps, ReactNode } from 'react';
import { classes } from './classes.ts';
import { useOverflows } from './use-overflows.ts';

type Props = {
  /** What the table holds, for those who cannot see it. */
  caption: string;
  head: readonly { label: ReactNode; numeric?: boolean; hidden?: boolean }[];
  children: ReactNode;
};

/** A table that is read: hairlines, heads in words, numbers to the right; one that is too wide scrolls by itself. */
export function Table({ caption, head, children }: Props) {
  const { ref, overflows } = useOverflows();
  // A table that scrolls takes the focus, so that the keyboard can scroll it too.
  const scroller = overflows ? { tabIndex: 0, role: 'group', 'aria-label': caption } : {};
  return (
    <div ref={ref} className="relative overflow-x-auto" {...scroller}>
      <table className="w-full border-collapse text-left">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr className="border-b border-line-strong text-sm text-ink-soft">
            {head.map(({ label, numeric, hidden }, index) => (
              <th
                key={index}
                scope="col"
                className={classes('py-2 pr-6 align-bottom font-semibold last:pr-0', numeric && 'text-right')}
              >
                {hidden ? <span className="sr-only">{label}</span> : label}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>{children}</tbody>
      </table>
    </div>
  );
}

export function Row({ className, ...row }: ComponentProps<'tr'>) {
  return <tr {...row} className={classes('border-b border-line', className)} />;
}

export function Cell({ numeric, className, ...cell }: { numeric?: boolean } & ComponentProps<'td'>) {
  return <td {...cell} className={classes('py-3 pr-6 align-baseline last:pr-0', numeric && 'text-right', className)} />;
}

import type { ReactNode } from 'react';

type Props = {
  label: string;
  entries: readonly { key: string; name: string; note: string }[];
  shown: string | null;
  onShow: (key: string) => void;
  /** Detail of the entry that is open; the first one when none was chosen. */
  children: (key: string) => ReactNode;
};

/** List at the left, one entry at the right. */
export function Browse({ label, entries, shown, onShow, children }: Props) {
  const open = entries.find(({ key }) => key === shown) ?? entries[0];
  if (!open) return <p className="py-6 text-ink-soft">The library holds none of these.</p>;
  return (
    <div className="grid gap-x-8 gap-y-8 lg:gap-x-10 md:grid-cols-[12rem_1fr] lg:grid-cols-[17rem_1fr]">
      <ul aria-label={label} className="max-h-64 overflow-y-auto border-t border-line md:max-h-[70dvh]">
        {entries.map(({ key, name, note }) => (
          <li key={key} className="border-b border-line">
            <button
              type="button"
              aria-current={key === open.key || undefined}
              onClick={() => onShow(key)}
              className="block w-full border-l-2 border-transparent px-3 py-2 text-left -outline-offset-2 hover:bg-panel aria-[current=true]:border-copper aria-[current=true]:bg-panel"
            >
              <span className="block font-semibold break-words">{name}</span>
              <span className="block text-sm text-ink-soft">{note}</span>
            </button>
          </li>
        ))}
      </ul>
      <article className="min-w-0">
        <h2 className="text-xl">{open.name}</h2>
        {children(open.key)}
      </article>
    </div>
  );
}

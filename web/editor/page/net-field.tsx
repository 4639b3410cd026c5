import { useId, useState } from 'react';
import { netNames } from '../net-names.ts';
import { useEditor } from '../editor-context.ts';

type Props = { label: string; value: string; onCommit: (net: string) => void; disabled?: boolean };

/** Name of a net in a bar: typed, with the nets of the board offered. */
export function NetField({ label, value, onCommit, disabled }: Props) {
  const id = useId();
  const board = useEditor((state) => state.board);
  const [draft, setDraft] = useState<string | null>(null);
  const settle = () => {
    const text = draft?.trim();
    setDraft(null);
    if (text && text !== value) onCommit(text);
  };
  return (
    <span className="inline-flex items-center gap-2 text-sm">
      <label htmlFor={id} className="text-ink-soft">
        {label}
      </label>
      <input
        id={id}
        list={`${id}-nets`}
        value={draft ?? value}
        disabled={disabled}
        maxLength={80}
        autoComplete="off"
        spellCheck={false}
        onChange={(event) => setDraft(event.target.value)}
        onBlur={settle}
        onKeyDown={(event) => {
          if (event.key === 'Enter') settle();
          if (event.key === 'Escape') setDraft(null);
        }}
        className="min-h-8 w-28 rounded-sm border border-line-strong bg-panel px-2"
      />
      <datalist id={`${id}-nets`}>
        {netNames(board).map((net) => (
          <option key={net} value={net}>
            {net}
          </option>
        ))}
      </datalist>
    </span>
  );
}

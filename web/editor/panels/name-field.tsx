import { useId, useState } from 'react';
import { TextField } from '#web/ui/text-field.tsx';

type Props = {
  label: string;
  value: string;
  onCommit: (value: string) => void;
  /** Why a text cannot be taken; null when it can. */
  refuse?: (value: string) => string | null;
  /** Texts to choose from. */
  offered?: readonly string[];
  disabled?: boolean;
  maxLength?: number;
};

/** One line of text that commits on Enter or on leaving; Escape restores; what is refused stays with its reason. */
export function NameField({ label, value, onCommit, refuse, offered, disabled, maxLength = 80 }: Props) {
  const [draft, setDraft] = useState<string | null>(null);
  const [error, setError] = useState<string | undefined>();
  const listId = useId();
  const settle = () => {
    const text = draft?.trim();
    if (text === undefined) return;
    if (text === value) return leave();
    const reason = text === '' ? 'Enter a name.' : (refuse?.(text) ?? null);
    if (reason !== null) return setError(reason);
    leave();
    onCommit(text);
  };
  const leave = () => {
    setDraft(null);
    setError(undefined);
  };
  return (
    <>
      <TextField
        label={label}
        value={draft ?? value}
        error={error}
        disabled={disabled}
        maxLength={maxLength}
        autoComplete="off"
        spellCheck={false}
        list={offered ? listId : undefined}
        onChange={(event) => setDraft(event.target.value)}
        onBlur={settle}
        onKeyDown={(event) => {
          if (event.key === 'Enter') settle();
          if (event.key === 'Escape' && draft !== null) {
            event.stopPropagation();
            leave();
          }
        }}
      />
      {offered ? (
        <datalist id={listId}>
          {offered.map((text) => (
            <option key={text} value={text}>
              {text}
            </option>
          ))}
        </datalist>
      ) : null}
    </>
  );
}

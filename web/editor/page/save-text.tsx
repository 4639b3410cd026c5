import { useEffect } from 'react';
import { announce } from '#web/ui/announce.ts';
import { Button } from '#web/ui/button.tsx';
import { useEditor } from '../editor-context.ts';
import { changesSinceSave } from '../editor-store.ts';
import { saveStateText } from '../saving/save-state.ts';
import { timeText } from '../saving/time-text.ts';

export type SaveActs = {
  /** Tries to save once more. */
  retry: () => void;
  /** Shows the ways out of a conflict again. */
  decide: () => void;
};

/** Where the sketch stands between this page and the server, or why it cannot be changed at all. */
export function SaveText({ retry, decide }: SaveActs) {
  const save = useEditor((state) => state.save);
  const changes = useEditor(changesSinceSave);
  const readOnly = useEditor((state) => state.readOnly);
  const text = saveStateText(save, changes, timeText);
  const isTrouble = save.kind === 'offline' || save.kind === 'failed' || save.kind === 'conflict';
  useEffect(() => {
    if (isTrouble) announce(text);
  }, [isTrouble, text]);
  if (readOnly !== null) {
    return (
      <p className="text-sm">
        <strong>Read only.</strong> {readOnly}
      </p>
    );
  }
  if (!isTrouble) return <p className="text-sm text-ink-soft">{text}</p>;
  return (
    <div className="flex items-center gap-2">
      <p title={text} className="line-clamp-2 max-w-40 text-right text-xs leading-tight font-semibold text-over">
        {text}
      </p>
      <Button size="small" onClick={save.kind === 'conflict' ? decide : retry}>
        {save.kind === 'conflict' ? 'Decide' : 'Try again'}
      </Button>
    </div>
  );
}

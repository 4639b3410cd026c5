import { useEffect } from 'react';
import { announce } from '#web/ui/announce.ts';
import { useEditor } from '../editor-context.ts';
import { changesSinceSave } from '../editor-store.ts';
import { saveStateText } from '../saving/save-state.ts';
import { timeText } from '../saving/time-text.ts';

/** Where the sketch stands between this page and the server, or why it cannot be changed at all. */
export function SaveText() {
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
      <p className="max-w-[34rem] text-sm">
        <strong>Read only.</strong> {readOnly}
      </p>
    );
  }
  return (
    <p
      role={isTrouble ? 'alert' : undefined}
      className={isTrouble ? 'text-sm font-semibold text-over' : 'text-sm text-ink-soft'}
    >
      {text}
    </p>
  );
}

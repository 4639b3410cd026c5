import { useState } from 'react';
import { Button } from '#web/ui/button.tsx';
import { Dialog } from '#web/ui/dialog.tsx';
import { useEditor } from '../editor-context.ts';
import { objectDifferences } from '../object-differences.ts';
import type { Autosave } from './autosave.ts';
import { dateTimeText } from './time-text.ts';

type Props = {
  autosave: Pick<Autosave, 'takeTheirs' | 'keepMine'>;
  /** Version whose conflict was put off; null: none. */
  postponed: number | null;
  postpone: (version: number | null) => void;
};

/** Somebody saved meanwhile: who and when, what this page has changed, and two ways out that lose nothing. */
export function ConflictDialog({ autosave, postponed, postpone }: Props) {
  const save = useEditor((state) => state.save);
  const board = useEditor((state) => state.board);
  const savedBoard = useEditor((state) => state.savedBoard);
  const [fault, setFault] = useState<string | null>(null);
  if (save.kind !== 'conflict') return null;
  const { version, savedBy, savedAt } = save.current;
  const mine = objectDifferences(savedBoard, board);
  const choose = (way: () => Promise<void>) => {
    setFault(null);
    way().catch((error: unknown) => setFault(error instanceof Error ? error.message : String(error)));
  };
  return (
    <Dialog
      title={`${savedBy} has saved this sketch meanwhile`}
      open={postponed !== version}
      onOpenChange={(open) => postpone(open ? null : version)}
      footer={
        <>
          <Button onClick={() => choose(autosave.takeTheirs)}>Take theirs</Button>
          <Button variant="primary" onClick={() => choose(autosave.keepMine)}>
            Keep mine on top
          </Button>
        </>
      }
    >
      <p>Their version was saved {dateTimeText(savedAt)}. Yours is not saved; it is kept on this device.</p>
      <p className="mt-3 font-semibold">Changed here since the last save</p>
      <ul className="list-disc pl-5">
        {mine.slice(0, 12).map((line) => (
          <li key={line}>{line}</li>
        ))}
        {mine.length > 12 ? <li>and {mine.length - 12} more</li> : null}
      </ul>
      <p className="mt-3">
        <strong>Take theirs</strong> shows their version; undo brings yours back. <strong>Keep mine on top</strong>{' '}
        saves yours as the newest version; theirs stays in the list of versions.
      </p>
      {fault ? (
        <p role="alert" className="mt-3 font-semibold text-over">
          {fault}
        </p>
      ) : null}
    </Dialog>
  );
}

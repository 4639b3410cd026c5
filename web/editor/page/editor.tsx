import { useState } from 'react';
import type { Board, BoardDocument } from '#core/board/document.ts';
import type { RevisionView, SketchView } from '#core/contract/assemblies.ts';
import { BoardCanvas } from '../canvas/board-canvas.tsx';
import { CanvasFooter } from '../canvas/canvas-footer.tsx';
import { ZoomCorner } from '../canvas/zoom-corner.tsx';
import { KeysDialog } from '../commands/keys-dialog.tsx';
import { useClipboard } from '../commands/use-clipboard.ts';
import { useShortcuts } from '../commands/use-shortcuts.ts';
import { EditorContext } from '../editor-context.ts';
import { createEditorStore } from '../editor-store.ts';
import { ConflictDialog } from '../saving/conflict-dialog.tsx';
import { LeaveDialog } from '../saving/leave-dialog.tsx';
import { useAutosave } from '../saving/use-autosave.ts';
import { useSolving } from '../solve/use-solving.ts';
import { ConditionBar } from './condition-bar.tsx';
import { LadderShelf } from './ladder-shelf.tsx';
import { SidePanel } from './side-panel.tsx';
import { ToolBar } from './tool-bar.tsx';
import { ToolOptions } from './tool-options.tsx';
import { useReadOnly } from './use-read-only.ts';
import { useSearchSync } from './use-search-sync.ts';

type Props = {
  revision: RevisionView;
  /** `board` with every default filled in, `written` as it is stored. */
  sketch: SketchView & { board: Board; written: BoardDocument };
  userId: string;
};

/** The sketch page: bars above, canvas in the middle, panels to the right (below on a narrow window), ladders at the foot. */
export function Editor({ revision, sketch, userId }: Props) {
  const [store] = useState(() => createEditorStore({ ...sketch, readOnly: null }));
  const [keysShown, showKeys] = useState(false);
  const [postponed, postpone] = useState<number | null>(null);
  useReadOnly(store, revision);
  const autosave = useAutosave(store, { revisionId: revision.id, userId, sketch });
  useSolving(store);
  useSearchSync(store);
  useShortcuts(store, () => showKeys(true));
  useClipboard(store);
  return (
    <EditorContext value={store}>
      <div className="flex min-h-0 min-w-0 flex-1 flex-col">
        <ToolBar showKeys={() => showKeys(true)} retry={() => void autosave.flush()} decide={() => postpone(null)} />
        <ConditionBar revisionId={revision.id} maySolve={revision.allowed.includes('solve')} flush={autosave.flush} />
        <div className="flex min-h-0 min-w-0 flex-1 flex-col lg:flex-row">
          <section aria-label="Board" className="relative flex min-h-72 min-w-0 flex-[3] flex-col lg:min-h-0">
            <div className="relative min-h-0 flex-1">
              <BoardCanvas />
              <ToolOptions />
              <ZoomCorner />
            </div>
            <CanvasFooter />
          </section>
          <SidePanel />
        </div>
        <LadderShelf />
      </div>
      <KeysDialog open={keysShown} onOpenChange={showKeys} />
      <ConflictDialog autosave={autosave} postponed={postponed} postpone={postpone} />
      <LeaveDialog flush={autosave.flush} />
    </EditorContext>
  );
}

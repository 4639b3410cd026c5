import { useState } from 'react';
import type { Board, BoardDocument } from '#core/board/document.ts';
import type { RevisionView, SketchView } from '#core/contract/assemblies.ts';
import { EditorContext, useEditor, useEditorStore } from '#web/editor/editor-context.ts';
import { createEditorStore, redo, undo } from '#web/editor/editor-store.ts';
import { SaveText } from '#web/editor/page/save-text.tsx';
import { useReadOnly } from '#web/editor/page/use-read-only.ts';
import { ConflictDialog } from '#web/editor/saving/conflict-dialog.tsx';
import { LeaveDialog } from '#web/editor/saving/leave-dialog.tsx';
import { useAutosave } from '#web/editor/saving/use-autosave.ts';
import { Button } from '#web/ui/button.tsx';
import { announce } from '#web/ui/announce.ts';
import { ConditionSection } from './condition-section.tsx';
import { CriteriaSection } from './criteria-section.tsx';
import { RailsSection } from './rails-section.tsx';
import { SuppliesSection } from './supplies-section.tsx';

type Props = {
  revision: RevisionView;
  sketch: SketchView & { board: Board; written: BoardDocument };
  userId: string;
};

/** The electrical side of a sketch: the same board, steps and saving as on the sketch page, as forms. */
export function ConditionsForm({ revision, sketch, userId }: Props) {
  const [store] = useState(() => createEditorStore({ ...sketch, readOnly: null }));
  const [postponed, postpone] = useState<number | null>(null);
  useReadOnly(store, revision);
  const autosave = useAutosave(store, { revisionId: revision.id, userId, sketch });
  return (
    <EditorContext value={store}>
      <StepBar retry={() => void autosave.flush()} decide={() => postpone(null)} />
      <ConditionSection />
      <SuppliesSection />
      <RailsSection />
      <CriteriaSection />
      <ConflictDialog autosave={autosave} postponed={postponed} postpone={postpone} />
      <LeaveDialog flush={autosave.flush} />
    </EditorContext>
  );
}

function StepBar({ retry, decide }: { retry: () => void; decide: () => void }) {
  const store = useEditorStore();
  const readOnly = useEditor((state) => state.readOnly !== null);
  const mayUndo = useEditor((state) => state.history.undo.length > 0);
  const mayRedo = useEditor((state) => state.history.redo.length > 0);
  const step = (word: string, act: typeof undo) => () => {
    const name = act(store);
    if (name) announce(`${word}: ${name}`);
  };
  return (
    <div className="mb-6 flex flex-wrap items-center justify-between gap-3">
      {readOnly ? (
        <span />
      ) : (
        <div className="flex gap-2">
          <Button size="small" disabled={!mayUndo} onClick={step('Undone', undo)}>
            Undo
          </Button>
          <Button size="small" disabled={!mayRedo} onClick={step('Redone', redo)}>
            Redo
          </Button>
        </div>
      )}
      <SaveText retry={retry} decide={decide} />
    </div>
  );
}

import { setTitle } from '#core/board/edits/set-title.ts';
import { useEditor, useEditorStore } from '../editor-context.ts';
import { shownBoard } from '../editor-store.ts';
import { outlineKey } from '#core/board/object-key.ts';
import { Button } from '#web/ui/button.tsx';
import { Group, Wide } from './group.tsx';
import { NameField } from './name-field.tsx';
import { RingBoxFields } from './ring-box-fields.tsx';
import { StackupForm } from './stackup-form.tsx';
import { useEdit } from './use-edit.ts';

/** The board itself: title, size, stack-up. Shown while nothing is selected. */
export function BoardPanel() {
  const store = useEditorStore();
  const board = useEditor(shownBoard);
  const { edit, disabled } = useEdit();
  return (
    <>
      <Group title="Board">
        <Wide>
          <NameField
            label="Title of the sketch"
            value={board.title}
            maxLength={200}
            disabled={disabled}
            onCommit={(title) => edit('Change the title', (before) => setTitle(before, title))}
          />
        </Wide>
      </Group>
      <RingBoxFields objectKey={outlineKey} ring={board.outline.points} />
      <div className="flex flex-wrap items-center gap-3 border-b border-line px-4 py-2 text-sm">
        <span>
          Outline with {board.outline.points.length} corners, {board.outline.cutouts.length} cut-outs
        </span>
        <Button size="small" onClick={() => store.setState({ selection: [outlineKey] })}>
          Corners
        </Button>
      </div>
      <StackupForm stackup={board.stackup} />
    </>
  );
}

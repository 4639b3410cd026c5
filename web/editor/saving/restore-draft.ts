import { toast } from 'sonner';
import type { Board } from '#core/board/document.ts';
import { boardDocument } from '#core/board/document.ts';
import type { SketchView } from '#core/contract/assemblies.ts';
import { type EditorStore, commit } from '../editor-store.ts';
import type { DraftStore } from './draft-store.ts';

/**
 * Brings back changes that never reached the server, as one step that can be undone. Where somebody has saved since,
 * it leads into the same choice as any other conflict.
 */
export async function restoreDraft(
  store: EditorStore,
  drafts: DraftStore,
  sketch: SketchView & { board: Board },
): Promise<void> {
  const draft = await drafts.read();
  if (!draft || store.getState().readOnly !== null) return;
  const read = boardDocument.safeParse(draft.board);
  if (!read.success || JSON.stringify(read.data) === JSON.stringify(sketch.board)) return drafts.remove();
  if (draft.baseVersion !== sketch.version) {
    const { version, savedBy, savedAt } = sketch;
    store.setState({ save: { kind: 'conflict', current: { version, savedBy, savedAt } } });
  }
  commit(store, 'Bring back unsaved changes', () => read.data);
  toast('Unsaved changes were brought back', {
    description: 'This device had kept them. Undo takes them away again.',
  });
}

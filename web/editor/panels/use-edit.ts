import { useCallback } from 'react';
import type { Board } from '#core/board/document.ts';
import { useEditor, useEditorStore } from '../editor-context.ts';
import { commit } from '../editor-store.ts';

export type Edit = (name: string, edit: (board: Board) => Board) => void;

/** One undoable step from a form, and whether forms may change anything. */
export function useEdit(): { edit: Edit; disabled: boolean } {
  const store = useEditorStore();
  const disabled = useEditor((state) => state.readOnly !== null);
  const edit = useCallback<Edit>((name, change) => commit(store, name, change), [store]);
  return { edit, disabled };
}

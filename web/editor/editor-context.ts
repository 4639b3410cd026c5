import { createContext, useContext } from 'react';
import { useStore } from 'zustand';
import type { EditorState, EditorStore } from './editor-store.ts';

export const EditorContext = createContext<EditorStore | null>(null);

/** The store of the editor around. @throws Error outside of one */
export function useEditorStore(): EditorStore {
  const store = useContext(EditorContext);
  if (!store) throw new Error('an editor component stands outside of the editor');
  return store;
}

/** A piece of the editor's state; the component follows it. The selector must not make new objects. */
export function useEditor<T>(select: (state: EditorState) => T): T {
  return useStore(useEditorStore(), select);
}

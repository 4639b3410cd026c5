import { useEffect } from 'react';
import { pasteObjects } from '#core/board/edits/paste-objects.ts';
import { clippingOf, readClipping } from '#core/board/object-clipping.ts';
import { announce } from '#web/ui/announce.ts';
import { type EditorStore, commit } from '../editor-store.ts';
import { named } from '../tools/select-tool.ts';
import { isTyping } from './shortcut.ts';

/** Ctrl+C and Ctrl+V of the sketch page, through the system's clipboard as JSON text, so that they work between boards. */
export function useClipboard(store: EditorStore): void {
  useEffect(() => {
    const onCopy = (event: ClipboardEvent) => {
      const { board, selection } = store.getState();
      // Text that is marked on the page is what the person means then.
      if (isTyping(event.target) || document.getSelection()?.isCollapsed === false) return;
      const clipping = clippingOf(board, selection);
      const count = Object.values(clipping).reduce((sum, list) => sum + (Array.isArray(list) ? list.length : 0), 0);
      if (count === 0) return;
      event.clipboardData?.setData('text/plain', JSON.stringify(clipping, null, 2));
      event.preventDefault();
      announce(`Copied ${named(selection)}.`);
    };
    const onPaste = (event: ClipboardEvent) => {
      const { readOnly, gridMm } = store.getState();
      if (isTyping(event.target) || readOnly !== null) return;
      const clipping = readClipping(event.clipboardData?.getData('text/plain') ?? '');
      if (!clipping) return announce('The clipboard holds no objects of a board.');
      event.preventDefault();
      const step = Math.max(gridMm, 2);
      const pasted = pasteObjects(store.getState().board, clipping, [step, -step]);
      commit(store, `Paste ${named(pasted.keys)}`, () => pasted.board);
      store.setState({ selection: pasted.keys });
      const without = pasted.dropped.length > 0 ? ` Did not come along: ${pasted.dropped.join('; ')}.` : '';
      announce(`Pasted ${named(pasted.keys)}.${without}`);
    };
    document.addEventListener('copy', onCopy);
    document.addEventListener('paste', onPaste);
    return () => {
      document.removeEventListener('copy', onCopy);
      document.removeEventListener('paste', onPaste);
    };
  }, [store]);
}

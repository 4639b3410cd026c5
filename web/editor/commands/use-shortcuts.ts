import { useEffect } from 'react';
import type { EditorStore } from '../editor-store.ts';
import { commandFor, isTyping } from './shortcut.ts';
import { singleKeysOn } from './single-keys.ts';

/** Keys of the whole sketch page; off while something is being typed. */
export function useShortcuts(store: EditorStore, showKeys: () => void): void {
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent) => {
      if (event.defaultPrevented || isTyping(event.target)) return;
      if (event.key === '?') {
        event.preventDefault();
        return showKeys();
      }
      const command = commandFor(event, singleKeysOn());
      if (!command?.may(store.getState())) return;
      event.preventDefault();
      command.run(store);
    };
    window.addEventListener('keydown', onKeyDown);
    return () => window.removeEventListener('keydown', onKeyDown);
  }, [store, showKeys]);
}

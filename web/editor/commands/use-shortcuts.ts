import { useEffect } from 'react';
import { canvasId } from '../canvas/canvas-id.ts';
import type { EditorStore } from '../editor-store.ts';
import { cancelGesture } from '../tools/cancel-gesture.ts';
import { toolCommands } from './command.ts';
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
      if (event.key === 'Escape') return void cancelGesture(store);
      const command = commandFor(event, singleKeysOn());
      if (!command?.may(store.getState())) return;
      event.preventDefault();
      command.run(store);
      // A tool chosen by its letter is meant for the arrow keys as well.
      if (toolCommands.includes(command)) document.getElementById(canvasId)?.focus();
    };
    window.addEventListener('keydown', onKeyDown);
    return () => window.removeEventListener('keydown', onKeyDown);
  }, [store, showKeys]);
}

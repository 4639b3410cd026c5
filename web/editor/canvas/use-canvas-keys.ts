import { type KeyboardEvent, useMemo, useRef } from 'react';
import { nudge } from '../commands/nudge.ts';
import type { EditorStore } from '../editor-store.ts';
import { cancelGesture } from '../tools/cancel-gesture.ts';
import { type ArrowKey, clickAtCrosshair, moveCrosshair } from '../tools/crosshair.ts';
import { toolOf } from '../tools/tool-of.ts';

/** Keys that belong to the canvas itself while it has the focus: arrows, Enter, Escape, space. */
export function useCanvasKeys(store: EditorStore) {
  const spaceHeld = useRef(false);
  const handlers = useMemo(
    () => ({
      tabIndex: 0,
      onKeyDown(event: KeyboardEvent<HTMLDivElement>) {
        const keys = { shift: event.shiftKey, alt: event.altKey };
        if (isArrow(event.key) && !event.ctrlKey && !event.metaKey) {
          event.preventDefault();
          arrow(store, event.key, keys);
        } else if (event.key === 'Enter') {
          event.preventDefault();
          if (event.shiftKey) toolOf(store.getState()).finish?.(store);
          else clickAtCrosshair(store, keys);
        } else if (event.key === 'Escape') {
          if (cancelGesture(store)) event.stopPropagation();
        } else if (event.key === ' ') {
          event.preventDefault();
          spaceHeld.current = true;
        }
      },
      onKeyUp(event: KeyboardEvent<HTMLDivElement>) {
        if (event.key === ' ') spaceHeld.current = false;
      },
      onBlur() {
        spaceHeld.current = false;
      },
    }),
    [store],
  );
  return { ...handlers, spaceHeld };
}

/** Arrows nudge what is selected; with a tool, a gesture or nothing selected they move the crosshair. */
function arrow(store: EditorStore, key: ArrowKey, keys: { shift: boolean; alt: boolean }): void {
  const { tool, selection, gesture, crosshair } = store.getState();
  const nudges = tool === 'select' && gesture.phase === 'idle' && selection.length > 0 && !crosshair;
  if (nudges) nudge(store, key, keys);
  else moveCrosshair(store, key, keys);
}

function isArrow(key: string): key is ArrowKey {
  return key === 'ArrowLeft' || key === 'ArrowRight' || key === 'ArrowUp' || key === 'ArrowDown';
}

import type { EditorStore } from '../editor-store.ts';
import { idle } from './gesture.ts';

/**
 * Escape, one level out: a gesture, then the tool, then the crosshair, then the selection.
 * @returns false when there was nothing to leave
 */
export function cancelGesture(store: EditorStore): boolean {
  const { gesture, live, tool, crosshair, selection } = store.getState();
  if (gesture.phase !== 'idle' || live) store.setState({ gesture: idle, live: null });
  else if (tool !== 'select') store.setState({ tool: 'select', crosshair: null });
  else if (crosshair) store.setState({ crosshair: null });
  else if (selection.length > 0) store.setState({ selection: [] });
  else return false;
  return true;
}

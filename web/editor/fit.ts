import { fitted, zoomedAt } from './camera.ts';
import { type EditorStore, shownBoard } from './editor-store.ts';

/** Rulers at the left and above, the zoom buttons below; some air everywhere. */
const insets = { left: 44, right: 22, top: 42, bottom: 48 };

/** Shows the whole board. */
export function fitBoard(store: EditorStore): void {
  const state = store.getState();
  if (state.view.width === 0) return;
  store.setState({ camera: fitted(shownBoard(state).outline.points, state.view, insets) });
}

/** Zooms about the middle of the picture. */
export function zoomBy(store: EditorStore, factor: number): void {
  const { camera, view } = store.getState();
  store.setState({ camera: zoomedAt(camera, view, [view.width / 2, view.height / 2], factor) });
}

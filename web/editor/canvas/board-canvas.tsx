import { useEffect, useRef } from 'react';
import { Stage } from 'react-konva/lib/ReactKonvaCore.js';
import { useEditor, useEditorStore } from '../editor-context.ts';
import { fitBoard } from '../fit.ts';
import { canvasId } from './canvas-id.ts';
import { CopperPicture } from './copper-picture.tsx';
import { HandPicture } from './hand-picture.tsx';
import { PartsPicture } from './parts-picture.tsx';
import { useCanvasKeys } from './use-canvas-keys.ts';
import { useCanvasPointer } from './use-canvas-pointer.ts';

/** The board as a picture that can be worked on; its twin for reading and for the keyboard is the object list. */
export function BoardCanvas() {
  const store = useEditorStore();
  const element = useRef<HTMLDivElement>(null);
  const { spaceHeld, ...keys } = useCanvasKeys(store);
  const pointer = useCanvasPointer(store, element, spaceHeld);
  const view = useEditor((state) => state.view);
  const tool = useEditor((state) => state.tool);

  useEffect(() => {
    const box = element.current;
    if (!box) return;
    let fittedCamera: unknown = null;
    const observer = new ResizeObserver(([entry]) => {
      if (!entry) return;
      const { width, height } = entry.contentRect;
      const { view, camera } = store.getState();
      store.setState({ view: { width: Math.floor(width), height: Math.floor(height) } });
      // The picture stays fitted while the window changes, until somebody has moved it.
      if (view.width !== 0 && camera !== fittedCamera) return;
      fitBoard(store);
      fittedCamera = store.getState().camera;
    });
    observer.observe(box);
    return () => observer.disconnect();
  }, [store]);

  return (
    <div
      ref={element}
      {...pointer}
      {...keys}
      id={canvasId}
      role="application"
      aria-label="Board canvas"
      aria-describedby="canvas-help"
      className="relative size-full touch-none overflow-hidden outline-offset-[-3px] select-none"
      style={{ cursor: tool === 'select' ? 'default' : tool === 'hand' ? 'grab' : 'crosshair' }}
    >
      <p id="canvas-help" className="sr-only">
        Everything on it is listed in the panel Objects. With a drawing tool the arrow keys move a crosshair and Enter
        sets a point; Escape goes one level out; the question mark lists all keys.
      </p>
      {view.width > 0 ? (
        <Stage width={view.width} height={view.height} listening={false} aria-hidden="true">
          <CopperPicture />
          <PartsPicture />
          <HandPicture />
        </Stage>
      ) : null}
    </div>
  );
}

import { type MouseEvent, type PointerEvent, type RefObject, useEffect, useMemo, useRef } from 'react';
import { type ScreenPoint, panned, toBoard, zoomedAt } from '../camera.ts';
import type { EditorStore } from '../editor-store.ts';
import { idle } from '../tools/gesture.ts';
import { pointerInput } from '../tools/pointer-input.ts';
import { panTool, toolOf } from '../tools/tool-of.ts';

const wheelRate = 0.0016;

/** Pointer, wheel and two fingers on the canvas; everything else about a tool lies in the tool. */
export function useCanvasPointer(
  store: EditorStore,
  canvas: RefObject<HTMLDivElement | null>,
  spaceHeld: RefObject<boolean>,
) {
  const fingers = useRef(new Map<number, ScreenPoint>());

  useEffect(() => {
    const element = canvas.current;
    if (!element) return;
    // React's own wheel listener is passive and could not keep the page from scrolling.
    const onWheel = (event: WheelEvent) => {
      event.preventDefault();
      const { camera, view } = store.getState();
      const at = screenPoint(element, event);
      const pixels = event.deltaMode === 1 ? event.deltaY * 30 : event.deltaY;
      store.setState({ camera: zoomedAt(camera, view, at, Math.exp(-pixels * wheelRate)) });
    };
    element.addEventListener('wheel', onWheel, { passive: false });
    return () => element.removeEventListener('wheel', onWheel);
  }, [store, canvas]);

  return useMemo(() => {
    const at = (event: PointerEvent<HTMLDivElement>) => screenPoint(event.currentTarget, event);
    const isPanning = () => store.getState().gesture.phase === 'panning';
    const tool = () => (isPanning() ? panTool : toolOf(store.getState()));
    const input = (event: PointerEvent<HTMLDivElement>) =>
      pointerInput(store.getState(), at(event), { shift: event.shiftKey, alt: event.altKey });

    return {
      onPointerDown(event: PointerEvent<HTMLDivElement>) {
        if (event.button === 2) return;
        event.currentTarget.setPointerCapture(event.pointerId);
        event.currentTarget.focus();
        if (event.pointerType === 'touch') fingers.current.set(event.pointerId, at(event));
        store.setState({ crosshair: null });
        if (fingers.current.size === 2) return store.setState({ gesture: idle, live: null });
        const pans = event.button === 1 || spaceHeld.current;
        (pans ? panTool : tool()).press(store, input(event));
      },
      onPointerMove(event: PointerEvent<HTMLDivElement>) {
        if (fingers.current.size === 2) return pinch(store, fingers.current, event.pointerId, at(event));
        const { camera, view } = store.getState();
        store.setState({ pointer: toBoard(camera, view, at(event)), crosshair: null });
        tool().move(store, input(event));
      },
      onPointerUp(event: PointerEvent<HTMLDivElement>) {
        const pinched = fingers.current.size === 2;
        fingers.current.delete(event.pointerId);
        if (event.button === 2 || pinched) return;
        tool().release(store, input(event));
      },
      onPointerCancel(event: PointerEvent<HTMLDivElement>) {
        fingers.current.delete(event.pointerId);
        store.setState({ gesture: idle, live: null });
      },
      onPointerLeave() {
        store.setState({ pointer: null });
      },
      onContextMenu(event: MouseEvent<HTMLDivElement>) {
        event.preventDefault();
      },
      onDoubleClick() {
        toolOf(store.getState()).finish?.(store);
      },
    };
  }, [store, spaceHeld]);
}

/** Two fingers: their middle moves the picture, their distance zooms it. */
function pinch(store: EditorStore, fingers: Map<number, ScreenPoint>, id: number, to: ScreenPoint): void {
  const other = [...fingers].find(([finger]) => finger !== id)?.[1];
  const from = fingers.get(id);
  if (!other || !from) return;
  fingers.set(id, to);
  const { camera, view } = store.getState();
  const distance = (point: ScreenPoint) => Math.max(20, Math.hypot(point[0] - other[0], point[1] - other[1]));
  const middle: ScreenPoint = [(to[0] + other[0]) / 2, (to[1] + other[1]) / 2];
  const moved = panned(camera, (to[0] - from[0]) / 2, (to[1] - from[1]) / 2);
  store.setState({ camera: zoomedAt(moved, view, middle, distance(to) / distance(from)) });
}

function screenPoint(element: HTMLElement, event: { clientX: number; clientY: number }): ScreenPoint {
  const box = element.getBoundingClientRect();
  return [event.clientX - box.left, event.clientY - box.top];
}

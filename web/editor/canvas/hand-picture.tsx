import { useMemo } from 'react';
import { useEditor } from '../editor-context.ts';
import { shownBoard } from '../editor-store.ts';
import { snapped } from '../grid.ts';
import type { Point } from '#core/board/outline.ts';
import { snapLines } from '../snap/snap-lines.ts';
import { snapPoint, snapReachPx } from '../snap/snap-shift.ts';
import { drawAlignment } from './draw-alignment.ts';
import type { ToolName, ToolSettings } from '../tools/tool-name.ts';
import { drawCrosshair, drawGesture, drawGhost, drawSelection } from './draw-overlay.ts';
import { drawRulers } from './draw-ruler.ts';
import { PictureLayer } from './picture-layer.tsx';
import { useThemePalette } from './use-theme-palette.ts';

/** Selection, the gesture under way, crosshair and rulers. */
export function HandPicture() {
  const palette = useThemePalette();
  const board = useEditor(shownBoard);
  const camera = useEditor((state) => state.camera);
  const view = useEditor((state) => state.view);
  const selection = useEditor((state) => state.selection);
  const gesture = useEditor((state) => state.gesture);
  const crosshair = useEditor((state) => state.crosshair);
  const pointer = useEditor((state) => state.pointer);
  const tool = useEditor((state) => state.tool);
  const settings = useEditor((state) => state.toolSettings);
  const gridMm = useEditor((state) => state.gridMm);
  const snapping = useEditor((state) => state.snapping);
  const objectSnapping = useEditor((state) => state.objectSnapping);
  const draw = useMemo(
    () => (pen: CanvasRenderingContext2D) => {
      const sheet = { pen, camera, view, palette };
      drawSelection(sheet, board, selection);
      drawGesture(sheet, gesture);
      const size = ghostSize(tool, settings);
      drawAlignment(sheet, board, gesture);
      const grid = (point: Point) => (snapping ? snapped(point, gridMm) : point);
      const settled = (point: Point) =>
        objectSnapping ? snapPoint(point, snapLines(board, []), snapReachPx / camera.pxPerMm, grid) : grid(point);
      const at = crosshair ?? (size && pointer ? settled(pointer) : null);
      if (size && at) drawGhost(sheet, at, size);
      if (crosshair) drawCrosshair(sheet, crosshair);
      drawRulers(sheet, crosshair ?? pointer);
    },
    [
      board,
      camera,
      view,
      palette,
      selection,
      gesture,
      crosshair,
      pointer,
      tool,
      settings,
      gridMm,
      snapping,
      objectSnapping,
    ],
  );
  return <PictureLayer draw={draw} />;
}

/** Size of what the tool would place, mm; null for tools that draw or select. */
function ghostSize(tool: ToolName, settings: ToolSettings): readonly number[] | null {
  switch (tool) {
    case 'regulator':
      return settings.part?.model.bodyMm ?? null;
    case 'source':
      return settings.source.sizeMm;
    case 'sink':
      return settings.sink.sizeMm;
    case 'probe':
      return [1.2, 1.2];
    case 'via-field': {
      const { columns, rows, pitchMm } = settings.viaField;
      const [px, py] = typeof pitchMm === 'number' ? [pitchMm, pitchMm] : pitchMm;
      return [columns * px, rows * py];
    }
    default:
      return null;
  }
}

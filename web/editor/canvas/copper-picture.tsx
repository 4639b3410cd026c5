import { useMemo } from 'react';
import { useEditor } from '../editor-context.ts';
import { shownBoard } from '../editor-store.ts';
import { drawBoardEdge, drawCopper, drawGrid, drawLaminate } from './draw-board.ts';
import { drawBands, drawIsotherms } from './draw-heat.ts';
import { PictureLayer } from './picture-layer.tsx';
import { useHeatPicture } from './use-heat-picture.ts';
import { useThemePalette } from './use-theme-palette.ts';

/** Laminate, heat and copper; drawn anew only when one of them or the camera changes. */
export function CopperPicture() {
  const palette = useThemePalette();
  const { outline, stackup, pours } = useEditor(shownBoard);
  const camera = useEditor((state) => state.camera);
  const view = useEditor((state) => state.view);
  const activeLayer = useEditor((state) => state.activeLayer);
  const gridMm = useEditor((state) => state.gridMm);
  const picture = useHeatPicture();
  const draw = useMemo(() => {
    const board = { outline, stackup, pours };
    return (pen: CanvasRenderingContext2D) => {
      const sheet = { pen, camera, view, palette };
      drawLaminate(sheet, board);
      if (picture) drawBands(sheet, board, picture);
      drawGrid(sheet, board, gridMm);
      drawCopper(sheet, board, activeLayer, picture !== null);
      if (picture) drawIsotherms(sheet, board, picture);
      drawBoardEdge(sheet, board);
    };
  }, [outline, stackup, pours, camera, view, palette, activeLayer, gridMm, picture]);
  return <PictureLayer draw={draw} />;
}

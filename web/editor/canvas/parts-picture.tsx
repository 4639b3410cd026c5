import { useMemo } from 'react';
import { useEditor } from '../editor-context.ts';
import { shownBoard } from '../editor-store.ts';
import { isCurrent } from '../solve/checks.ts';
import { drawBodies, drawLands } from './draw-board.ts';
import { drawIsothermLabels } from './draw-heat.ts';
import { drawMarks, occupiedBy } from './draw-marks.ts';
import { partMarks } from './part-marks.ts';
import { PictureLayer } from './picture-layer.tsx';
import { activeCheck, useHeatPicture } from './use-heat-picture.ts';
import { useThemePalette } from './use-theme-palette.ts';

/** Lands, vias, bodies, heat sources, sinks, probes, and the temperature of every regulator. */
export function PartsPicture() {
  const palette = useThemePalette();
  const board = useEditor(shownBoard);
  const camera = useEditor((state) => state.camera);
  const view = useEditor((state) => state.view);
  const picture = useHeatPicture();
  const check = useEditor(activeCheck);
  const draw = useMemo(
    () => (pen: CanvasRenderingContext2D) => {
      const sheet = { pen, camera, view, palette };
      drawLands(sheet, board, picture !== null);
      drawBodies(sheet, board);
      if (picture) drawIsothermLabels(sheet, board, picture, occupiedBy(sheet, board));
      drawMarks(sheet, board, partMarks(check?.condition ?? null), !check || !isCurrent(check, board));
    },
    [board, camera, view, palette, picture, check],
  );
  return <PictureLayer draw={draw} />;
}

import { useMemo } from 'react';
import { useEditor } from '../editor-context.ts';
import { shownBoard } from '../editor-store.ts';
import { isCurrent } from '../solve/checks.ts';
import { drawBodies, drawLands } from './draw-board.ts';
import { drawIsothermLabels } from './draw-heat.ts';
import { drawMarks } from './draw-marks.ts';
import { partMarks } from './part-marks.ts';
import { PictureLayer } from './picture-layer.tsx';
import { occupiedBoxes, placePlates } from './place-plates.ts';
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
      const plates = placePlates(sheet, board, partMarks(check?.condition ?? null));
      if (picture) drawIsothermLabels(sheet, board, picture, occupiedBoxes(sheet, board, plates));
      drawMarks(sheet, plates, !check || !isCurrent(check, board));
    },
    [board, camera, view, palette, picture, check],
  );
  return <PictureLayer draw={draw} />;
}

import type Konva from 'konva';
import 'konva/lib/Shape.js';
import { Layer, Shape } from 'react-konva/lib/ReactKonvaCore.js';

/** One layer of the stage that a pure function draws, with the browser's own pen. */
export function PictureLayer({ draw }: { draw: (pen: CanvasRenderingContext2D) => void }) {
  return (
    <Layer listening={false}>
      <Shape
        listening={false}
        perfectDrawEnabled={false}
        sceneFunc={(context: Konva.Context) => {
          const pen = context._context;
          pen.save();
          draw(pen);
          pen.restore();
        }}
      />
    </Layer>
  );
}

import { formatQuantity } from '#core/format.ts';
import { HeatLegend } from '#web/heat/heat-legend.tsx';
import { temperatureAt, temperatureRange } from '#web/heat/temperature-at.ts';
import { commands } from '../commands/command.ts';
import { useEditor, useEditorStore } from '../editor-context.ts';
import { shownBoard } from '../editor-store.ts';
import { isCurrent } from '../solve/checks.ts';
import { conditionScale, heatLimits } from './heat-picture.ts';
import { activeCheck } from './use-heat-picture.ts';

const zoomClass =
  'inline-flex size-8 items-center justify-center border-l border-line-strong text-base first:border-l-0 hover:bg-copper-soft';

/** Over the lower edge of the canvas: scale bar, coordinates with the temperature there, zoom. */
export function CanvasFooter() {
  const store = useEditorStore();
  return (
    <div className="pointer-events-none absolute inset-x-2 bottom-2 left-7 flex flex-wrap items-end justify-between gap-2">
      <Legend />
      <div className="flex flex-wrap items-end gap-2">
        <Place />
        <div className="pointer-events-auto flex rounded-sm border border-line-strong bg-panel">
          <button type="button" className={zoomClass} aria-label="Zoom out" onClick={() => commands.zoomOut.run(store)}>
            −
          </button>
          <button type="button" className={zoomClass} aria-label="Zoom in" onClick={() => commands.zoomIn.run(store)}>
            +
          </button>
          <button
            type="button"
            className={`${zoomClass} w-auto px-2 text-sm`}
            onClick={() => commands.fit.run(store)}
            title="Fit the board (0)"
          >
            Fit
          </button>
        </div>
      </div>
    </div>
  );
}

function Legend() {
  const check = useEditor(activeCheck);
  const layer = useEditor((state) => state.activeLayer);
  const board = useEditor(shownBoard);
  if (!check) return <span />;
  return (
    <div className="w-[min(26rem,100%)] border border-line-strong bg-panel px-3 pt-1.5 pb-1">
      <HeatLegend
        scale={conditionScale(check)}
        title={`Board, layer ${layer}${isCurrent(check, board) ? '' : ' (preview)'}`}
        range={check.field ? temperatureRange(check.field, layer) : null}
        limits={heatLimits(check.board, check.condition)}
      />
    </div>
  );
}

/** Coordinates of the pointer or the crosshair and the temperature there. */
function Place() {
  const at = useEditor((state) => state.crosshair ?? state.pointer);
  const check = useEditor(activeCheck);
  const layer = useEditor((state) => state.activeLayer);
  if (!at) return null;
  const temperature = check?.field ? temperatureAt(check.field, layer, at) : null;
  return (
    <p className="border border-line-strong bg-panel px-2 py-1 text-xs">
      x {formatQuantity(at[0], 'mm')}, y {formatQuantity(at[1], 'mm')}
      {temperature === null ? null : ` · ${formatQuantity(temperature, '°C')} on ${layer}`}
    </p>
  );
}

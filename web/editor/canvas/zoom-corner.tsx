import { formatQuantity } from '#core/format.ts';
import { temperatureAt } from '#web/heat/temperature-at.ts';
import { commands } from '../commands/command.ts';
import { useEditor, useEditorStore } from '../editor-context.ts';
import { activeCheck } from './use-heat-picture.ts';

const buttonClass =
  'inline-flex h-8 min-w-8 items-center justify-center border-l border-line-strong px-2 text-sm first:border-l-0 hover:bg-copper-soft';

/** In the lower right corner of the canvas: coordinates with the temperature there, and zoom. */
export function ZoomCorner() {
  const store = useEditorStore();
  return (
    <div className="pointer-events-none absolute right-2 bottom-2 flex items-center gap-2">
      <Place />
      <div className="pointer-events-auto flex rounded-sm border border-line-strong bg-panel">
        <button type="button" className={buttonClass} aria-label="Zoom out" onClick={() => commands.zoomOut.run(store)}>
          −
        </button>
        <button type="button" className={buttonClass} aria-label="Zoom in" onClick={() => commands.zoomIn.run(store)}>
          +
        </button>
        <button type="button" className={buttonClass} title="Fit the board (0)" onClick={() => commands.fit.run(store)}>
          Fit
        </button>
      </div>
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

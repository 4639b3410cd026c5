import { PartPicker } from '../parts/part-picker.tsx';
import { useEditor, useEditorStore } from '../editor-context.ts';
import { gridSteps } from '../grid.ts';
import { toolOf } from '../tools/tool-of.ts';
import { type ToolSettings, drawsShape, toolWords } from '../tools/tool-name.ts';
import { BarCheck, BarSelect } from './bar-field.tsx';
import { NetField } from './net-field.tsx';

/** What the chosen tool does and starts from; layer, grid and picture at the right. */
export function ToolOptions() {
  const store = useEditorStore();
  const tool = useEditor((state) => state.tool);
  const settings = useEditor((state) => state.toolSettings);
  const isDrawing = useEditor((state) => state.gesture.phase === 'polygon' && state.gesture.points.length >= 3);
  const change = (patch: Partial<ToolSettings>) =>
    store.setState(({ toolSettings }) => ({ toolSettings: { ...toolSettings, ...patch } }));
  return (
    <div className="flex min-h-11 flex-wrap items-center gap-x-4 gap-y-1 border-b border-line bg-paper px-2 py-1 sm:px-4">
      {drawsShape(tool) ? (
        <BarSelect
          label={toolWords[tool].label}
          value={settings.shape}
          onChange={(shape) => change({ shape })}
          options={[
            { value: 'rectangle', label: 'Rectangle by two corners' },
            { value: 'polygon', label: 'Polygon by its corners' },
          ]}
        />
      ) : null}
      {tool === 'pour' || tool === 'via-field' ? (
        <NetField label="Net" value={settings.net} onCommit={(net) => change({ net })} />
      ) : null}
      {tool === 'regulator' ? <PartPicker chosen={settings.part} onChoose={(part) => change({ part })} /> : null}
      {tool === 'regulator' || tool === 'source' || tool === 'probe' ? (
        <BarSelect
          label="Side"
          value={settings.side}
          onChange={(side) => change({ side })}
          options={[
            { value: 'top', label: 'Top' },
            { value: 'bottom', label: 'Bottom' },
          ]}
        />
      ) : null}
      {isDrawing ? (
        <button
          type="button"
          className="min-h-8 rounded-sm border border-line-strong bg-panel px-2 text-sm font-semibold hover:border-ink"
          onClick={() => toolOf(store.getState()).finish?.(store)}
        >
          Close the polygon
        </button>
      ) : null}
      <p className="hidden min-w-0 flex-1 truncate text-sm text-ink-soft xl:block" title={toolWords[tool].hint}>
        {toolWords[tool].hint}
      </p>
      <ViewOptions />
    </div>
  );
}

function ViewOptions() {
  const store = useEditorStore();
  const copper = useEditor((state) => state.board.stackup.copper);
  const activeLayer = useEditor((state) => state.activeLayer);
  const gridMm = useEditor((state) => state.gridMm);
  const snapping = useEditor((state) => state.snapping);
  const shown = useEditor((state) => state.shown);
  return (
    <div className="ml-auto flex flex-wrap items-center gap-x-4 gap-y-1">
      <BarSelect
        label="Layer"
        value={activeLayer}
        onChange={(layer) => store.setState({ activeLayer: layer })}
        options={copper.map(({ name }) => ({ value: name, label: name }))}
      />
      <BarSelect
        label="Show"
        value={shown}
        onChange={(value) => store.setState({ shown: value })}
        options={[
          { value: 'heat', label: 'Heat' },
          { value: 'copper', label: 'Copper' },
        ]}
      />
      <BarSelect
        label="Grid"
        value={String(gridMm)}
        onChange={(value) => store.setState({ gridMm: Number(value) })}
        options={gridSteps.map((step) => ({ value: String(step), label: `${step} mm` }))}
      />
      <BarCheck label="Snap" checked={snapping} onChange={(on) => store.setState({ snapping: on })} />
    </div>
  );
}

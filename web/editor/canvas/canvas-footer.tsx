import { HeatLegend } from '#web/heat/heat-legend.tsx';
import { temperatureRange } from '#web/heat/temperature-at.ts';
import { useEditor, useEditorStore } from '../editor-context.ts';
import { shownBoard } from '../editor-store.ts';
import { gridSteps } from '../grid.ts';
import { BarCheck, BarSelect } from '../page/bar-field.tsx';
import { isCurrent } from '../solve/checks.ts';
import { conditionScale, heatLimits } from './heat-picture.ts';
import { activeCheck } from './use-heat-picture.ts';

/** Below the canvas: the scale bar, always there, and what the picture shows. */
export function CanvasFooter() {
  return (
    <div className="flex min-h-20 flex-wrap items-center justify-between gap-x-5 gap-y-1 border-t border-line bg-panel px-3 py-1.5">
      <Legend />
      <ViewOptions />
    </div>
  );
}

function Legend() {
  const check = useEditor(activeCheck);
  const layer = useEditor((state) => state.activeLayer);
  const board = useEditor(shownBoard);
  const busy = useEditor((state) => state.checks.busy);
  if (!check) {
    return <p className="text-sm text-ink-soft">{busy ? 'Calculating temperatures …' : 'No temperatures yet'}</p>;
  }
  return (
    <div className="max-w-[30rem] min-w-60 flex-1">
      <HeatLegend
        scale={conditionScale(check)}
        title={`Board, layer ${layer}${isCurrent(check, board) ? '' : ' (preview)'}`}
        range={check.field ? temperatureRange(check.field, layer) : null}
        limits={heatLimits(check.board, check.condition)}
      />
    </div>
  );
}

function ViewOptions() {
  const store = useEditorStore();
  const copper = useEditor((state) => state.board.stackup.copper);
  const activeLayer = useEditor((state) => state.activeLayer);
  const gridMm = useEditor((state) => state.gridMm);
  const snapping = useEditor((state) => state.snapping);
  const objectSnapping = useEditor((state) => state.objectSnapping);
  const shown = useEditor((state) => state.shown);
  return (
    <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
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
      <BarCheck label="Snap to grid" checked={snapping} onChange={(on) => store.setState({ snapping: on })} />
      <BarCheck
        label="Snap to objects"
        checked={objectSnapping}
        onChange={(on) => store.setState({ objectSnapping: on })}
      />
    </div>
  );
}

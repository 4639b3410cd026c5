import type { ReactNode } from 'react';
import { useEditor, useEditorStore } from '../editor-context.ts';
import { PartPicker } from '../parts/part-picker.tsx';
import { type ToolSettings, drawsShape, toolWords } from '../tools/tool-name.ts';
import { toolOf } from '../tools/tool-of.ts';
import { BarSelect } from './bar-field.tsx';
import { NetField } from './net-field.tsx';

/** Over the upper edge of the canvas: what the chosen tool does and what its next object starts from. */
export function ToolOptions() {
  const store = useEditorStore();
  const tool = useEditor((state) => state.tool);
  const settings = useEditor((state) => state.toolSettings);
  const isCarrying = useEditor(({ gesture }) => 'held' in gesture && !gesture.held && gesture.phase !== 'rectangle');
  const isClosable = useEditor((state) => state.gesture.phase === 'polygon' && state.gesture.points.length >= 3);
  const change = (patch: Partial<ToolSettings>) =>
    store.setState(({ toolSettings }) => ({ toolSettings: { ...toolSettings, ...patch } }));
  if (tool === 'select' && isCarrying) return <Plate>Click or press Enter to put it down, Escape to leave it.</Plate>;
  if (tool === 'select' || tool === 'hand') return null;
  return (
    <Plate>
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
      <span className="text-ink-soft">{toolWords[tool].hint}</span>
      {isClosable ? (
        <button
          type="button"
          className="min-h-8 rounded-sm border border-line-strong bg-panel px-2 font-semibold hover:border-ink"
          onClick={() => toolOf(store.getState()).finish?.(store)}
        >
          Close the polygon
        </button>
      ) : null}
    </Plate>
  );
}

function Plate({ children }: { children: ReactNode }) {
  return (
    <div className="absolute top-7 right-2 left-8 pointer-events-none flex w-fit flex-wrap items-center gap-x-4 gap-y-1 border border-line-strong bg-panel px-3 py-1.5 text-sm [&_button]:pointer-events-auto [&_input]:pointer-events-auto [&_select]:pointer-events-auto">
      {children}
    </div>
  );
}

import { useDeferredValue } from 'react';
import { type Command, commands } from '../commands/command.ts';
import { Button } from '#web/ui/button.tsx';
import { useEditor, useEditorStore } from '../editor-context.ts';
import { shownBoard } from '../editor-store.ts';
import { type ObjectKey, idOf, kindOf } from '#core/board/object-key.ts';
import { BoardPanel } from './board-panel.tsx';
import { ManyPanel } from './many-panel.tsx';
import { PourPanel } from './pour-panel.tsx';
import { ProbePanel } from './probe-panel.tsx';
import { RegulatorPanel } from './regulator-panel.tsx';
import { RingPanel } from './ring-panel.tsx';
import { SinkPanel } from './sink-panel.tsx';
import { SourcePanel } from './source-panel.tsx';
import { ViaFieldPanel } from './via-field-panel.tsx';

/** What is selected, in figures; the board itself while nothing is. */
export function PropertiesPanel() {
  const selection = useEditor((state) => state.selection);
  const [only] = selection;
  if (!only) return <BoardPanel />;
  return (
    <>
      {selection.length > 1 ? <ManyPanel keys={selection} /> : <OnePanel key={only} objectKey={only} />}
      <SelectionActs />
    </>
  );
}

function OnePanel({ objectKey }: { objectKey: ObjectKey }) {
  // The figures may come a moment after the picture; a drag must not wait for them.
  const board = useDeferredValue(useEditor(shownBoard));
  const id = idOf(objectKey);
  switch (kindOf(objectKey)) {
    case 'regulator': {
      const regulator = board.regulators.find(({ ref }) => ref === id);
      return regulator ? <RegulatorPanel regulator={regulator} /> : null;
    }
    case 'source': {
      const source = board.sources.find(({ ref }) => ref === id);
      return source ? <SourcePanel source={source} /> : null;
    }
    case 'pour': {
      const pour = board.pours.find((item) => item.id === id);
      return pour ? <PourPanel pour={pour} /> : null;
    }
    case 'via-field': {
      const field = board.viaFields.find((item) => item.id === id);
      return field ? <ViaFieldPanel field={field} /> : null;
    }
    case 'sink': {
      const sink = board.sinks.find((item) => item.id === id);
      return sink ? <SinkPanel sink={sink} /> : null;
    }
    case 'probe': {
      const probe = board.probes.find((item) => item.id === id);
      return probe ? <ProbePanel probe={probe} /> : null;
    }
    case 'cutout': {
      const ring = board.outline.cutouts[Number(id)];
      return ring ? <RingPanel objectKey={objectKey} ring={ring} /> : null;
    }
    case 'outline':
      return <RingPanel objectKey={objectKey} ring={board.outline.points} />;
  }
}

/** Acts on the selection that also have keys. */
function SelectionActs() {
  return (
    <div className="flex flex-wrap gap-2 px-4 py-3">
      <Act command={commands.rotate} word="Rotate 90°" />
      <Act command={commands.pickUp} word="Pick up" />
      <Act command={commands.duplicate} />
      <Act command={commands.delete} isDanger />
    </div>
  );
}

function Act({ command, word, isDanger = false }: { command: Command; word?: string; isDanger?: boolean }) {
  const store = useEditorStore();
  const may = useEditor(command.may);
  return (
    <Button
      size="small"
      variant={isDanger ? 'danger' : 'plain'}
      disabled={!may}
      title={`${command.label} (${command.keys.join(', ')})`}
      onClick={() => command.run(store)}
    >
      {word ?? command.label}
    </Button>
  );
}

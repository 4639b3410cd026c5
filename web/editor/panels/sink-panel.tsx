import { changeSink } from '#core/board/edits/change-sink.ts';
import { renameObject } from '#core/board/edits/rename-object.ts';
import type { Sink } from '#core/board/copper.ts';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { SelectField } from '#web/ui/select-field.tsx';
import { useEditor } from '../editor-context.ts';
import { objectKey } from '#core/board/object-key.ts';
import { Group } from './group.tsx';
import { NameField } from './name-field.tsx';
import { PlaceFields } from './place-fields.tsx';
import { SizeFields } from './size-fields.tsx';
import { takenName } from './taken-name.ts';
import { useEdit } from './use-edit.ts';

/** A screw, clip or chassis contact in figures. */
export function SinkPanel({ sink }: { sink: Sink }) {
  const board = useEditor((state) => state.board);
  const { edit, disabled } = useEdit();
  const { id } = sink;
  const key = objectKey('sink', id);
  const change = (what: string, patch: Partial<Sink>) =>
    edit(`Change ${what} of sink ${id}`, (before) => changeSink(before, id, patch));
  return (
    <>
      <Group title="Sink">
        <NameField
          label="Id"
          value={id}
          maxLength={40}
          disabled={disabled}
          refuse={(text) => takenName(board, text)}
          onCommit={(text) => edit(`Rename sink ${id} to ${text}`, (before) => renameObject(before, key, text))}
        />
        <SelectField
          label="Layer"
          value={sink.layer}
          disabled={disabled}
          options={board.stackup.copper.map(({ name }) => ({ value: name, label: name }))}
          onChange={(layer) => change('the layer', { layer })}
        />
        <PlaceFields objectKey={key} at={sink.at} />
        <SizeFields
          sizeMm={sink.sizeMm}
          minimum={0.1}
          maximum={500}
          disabled={disabled}
          onChange={(sizeMm) => change('the size', { sizeMm })}
        />
      </Group>
      <Group title="Heat path">
        <QuantityField
          label="Conductance"
          unit="W/K"
          value={sink.conductanceWPerK}
          minimum={0}
          maximum={1000}
          disabled={disabled}
          onCommit={(conductanceWPerK) => conductanceWPerK !== null && change('the conductance', { conductanceWPerK })}
        />
        <QuantityField
          label="Fixed temperature"
          unit="°C"
          value={sink.toC === 'ambient' ? null : sink.toC}
          minimum={-100}
          maximum={300}
          optional
          hint="Empty: the ambient"
          disabled={disabled}
          onCommit={(toC) => change('the temperature', { toC: toC ?? 'ambient' })}
        />
      </Group>
    </>
  );
}

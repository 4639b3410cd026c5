import { changeProbe } from '#core/board/edits/change-probe.ts';
import { renameObject } from '#core/board/edits/rename-object.ts';
import type { Probe, Side } from '#core/board/placement.ts';
import { formatQuantity } from '#core/format.ts';
import { SelectField } from '#web/ui/select-field.tsx';
import { activeCheck } from '../canvas/use-heat-picture.ts';
import { useEditor } from '../editor-context.ts';
import { objectKey } from '#core/board/object-key.ts';
import { Group } from './group.tsx';
import { NameField } from './name-field.tsx';
import { PlaceFields } from './place-fields.tsx';
import { takenName } from './taken-name.ts';
import { useEdit } from './use-edit.ts';

/** A place where a temperature is read. */
export function ProbePanel({ probe }: { probe: Probe }) {
  const board = useEditor((state) => state.board);
  const check = useEditor(activeCheck);
  const { edit, disabled } = useEdit();
  const { id } = probe;
  const key = objectKey('probe', id);
  const read = check?.condition.probes.find((candidate) => candidate.id === id);
  return (
    <>
      {read ? <p className="px-4 pt-3 text-xl font-semibold">{formatQuantity(read.temperatureC, '°C')}</p> : null}
      <Group title="Probe">
        <NameField
          label="Id"
          value={id}
          maxLength={40}
          disabled={disabled}
          refuse={(text) => takenName(board, text)}
          onCommit={(text) => edit(`Rename probe ${id} to ${text}`, (before) => renameObject(before, key, text))}
        />
        <SelectField<Side>
          label="Side"
          value={probe.side}
          disabled={disabled}
          options={[
            { value: 'top', label: 'Top' },
            { value: 'bottom', label: 'Bottom' },
          ]}
          onChange={(side) => edit(`Change the side of probe ${id}`, (before) => changeProbe(before, id, { side }))}
        />
        <PlaceFields objectKey={key} at={probe.at} />
      </Group>
    </>
  );
}

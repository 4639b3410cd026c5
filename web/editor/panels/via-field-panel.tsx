import { changeViaField } from '#core/board/edits/change-via-field.ts';
import { renameObject } from '#core/board/edits/rename-object.ts';
import type { ViaField } from '#core/board/copper.ts';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { SelectField } from '#web/ui/select-field.tsx';
import { useEditor } from '../editor-context.ts';
import { pitchOf } from '#core/board/footprint.ts';
import { netNames } from '../net-names.ts';
import { objectKey } from '#core/board/object-key.ts';
import { Group } from './group.tsx';
import { NameField } from './name-field.tsx';
import { PlaceFields } from './place-fields.tsx';
import { takenName } from './taken-name.ts';
import { useEdit } from './use-edit.ts';

const fillings: readonly { value: ViaField['filling']; label: string }[] = [
  { value: 'open', label: 'open' },
  { value: 'resin', label: 'resin' },
  { value: 'copper', label: 'copper' },
];

/** A via field in figures. */
export function ViaFieldPanel({ field }: { field: ViaField }) {
  const board = useEditor((state) => state.board);
  const { edit, disabled } = useEdit();
  const { id } = field;
  const key = objectKey('via-field', id);
  const [pitchX, pitchY] = pitchOf(field);
  const layers = board.stackup.copper.map(({ name }) => ({ value: name, label: name }));
  const change = (what: string, patch: Partial<ViaField>) =>
    edit(`Change ${what} of via field ${id}`, (before) => changeViaField(before, id, patch));
  const setPitch = (x: number, y: number) => change('the pitch', { pitchMm: x === y ? x : [x, y] });
  const shared = { disabled };
  return (
    <>
      <Group title="Via field">
        <NameField
          label="Id"
          value={id}
          maxLength={40}
          disabled={disabled}
          refuse={(text) => takenName(board, text)}
          onCommit={(text) => edit(`Rename via field ${id} to ${text}`, (before) => renameObject(before, key, text))}
        />
        <NameField
          label="Net"
          value={field.net}
          offered={netNames(board)}
          disabled={disabled}
          onCommit={(net) => change('the net', { net })}
        />
        <SelectField
          label="From layer"
          value={field.from}
          options={layers}
          disabled={disabled}
          onChange={(from) => change('the layers', { from })}
        />
        <SelectField
          label="To layer"
          value={field.to}
          options={layers}
          disabled={disabled}
          onChange={(to) => change('the layers', { to })}
        />
        <PlaceFields objectKey={key} at={field.at} rotationDeg={field.rotationDeg} />
      </Group>
      <Group title={`${field.columns * field.rows} vias`}>
        {(['columns', 'rows'] as const).map((count) => (
          <QuantityField
            key={count}
            {...shared}
            label={count === 'columns' ? 'Columns' : 'Rows'}
            unit=""
            value={field[count]}
            minimum={1}
            maximum={200}
            onCommit={(value) => value !== null && change('the grid', { [count]: Math.round(value) })}
          />
        ))}
        <QuantityField
          {...shared}
          label="Pitch in x"
          unit="mm"
          value={pitchX}
          minimum={0.1}
          maximum={100}
          onCommit={(x) => x !== null && setPitch(x, pitchY)}
        />
        <QuantityField
          {...shared}
          label="Pitch in y"
          unit="mm"
          value={pitchY}
          minimum={0.1}
          maximum={100}
          onCommit={(y) => y !== null && setPitch(pitchX, y)}
        />
        <QuantityField
          {...shared}
          label="Finished hole"
          unit="mm"
          value={field.drillMm}
          minimum={0.05}
          maximum={10}
          onCommit={(drillMm) => drillMm !== null && change('the hole', { drillMm })}
        />
        <QuantityField
          {...shared}
          label="Plating"
          unit="µm"
          value={field.platingUm}
          minimum={1}
          maximum={200}
          onCommit={(platingUm) => platingUm !== null && change('the plating', { platingUm })}
        />
        <SelectField
          label="Filling"
          value={field.filling}
          options={fillings}
          disabled={disabled}
          onChange={(filling) => change('the filling', { filling })}
        />
      </Group>
    </>
  );
}

import { changePour } from '#core/board/edits/change-pour.ts';
import { renameObject } from '#core/board/edits/rename-object.ts';
import type { Pour } from '#core/board/copper.ts';
import { Button } from '#web/ui/button.tsx';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { SelectField } from '#web/ui/select-field.tsx';
import { useEditor } from '../editor-context.ts';
import { netNames } from '../net-names.ts';
import { objectKey } from '#core/board/object-key.ts';
import { CornerTable } from './corner-table.tsx';
import { Group, Wide } from './group.tsx';
import { NameField } from './name-field.tsx';
import { RingBoxFields } from './ring-box-fields.tsx';
import { takenName } from './taken-name.ts';
import { useEdit } from './use-edit.ts';

/** A pour in figures: net, layer, box, corners, holes. */
export function PourPanel({ pour }: { pour: Pour }) {
  const board = useEditor((state) => state.board);
  const { edit, disabled } = useEdit();
  const { id } = pour;
  const key = objectKey('pour', id);
  const change = (what: string, patch: Partial<Pour>) =>
    edit(`Change ${what} of pour ${id}`, (before) => changePour(before, id, patch));
  return (
    <>
      <Group title="Pour">
        <NameField
          label="Id"
          value={id}
          maxLength={40}
          disabled={disabled}
          refuse={(text) => takenName(board, text)}
          onCommit={(text) => edit(`Rename pour ${id} to ${text}`, (before) => renameObject(before, key, text))}
        />
        <NameField
          label="Net"
          value={pour.net}
          offered={netNames(board)}
          disabled={disabled}
          onCommit={(net) => change('the net', { net })}
        />
        <SelectField
          label="Layer"
          value={pour.layer}
          disabled={disabled}
          options={board.stackup.copper.map(({ name }) => ({ value: name, label: name }))}
          onChange={(layer) => change('the layer', { layer })}
        />
        <QuantityField
          label="Coverage"
          unit="%"
          value={pour.coverage * 100}
          minimum={0}
          maximum={100}
          disabled={disabled}
          onCommit={(percent) => percent !== null && change('the coverage', { coverage: percent / 100 })}
        />
        <QuantityField
          label="Emissivity"
          unit=""
          value={pour.emissivity}
          minimum={0.01}
          maximum={1}
          optional
          hint="Empty: as the face"
          disabled={disabled}
          onCommit={(emissivity) => change('the emissivity', { emissivity })}
        />
      </Group>
      <RingBoxFields objectKey={key} ring={pour.points} />
      <CornerTable objectKey={key} ring={pour.points} />
      {pour.holes.length > 0 ? (
        <Group title={pour.holes.length === 1 ? '1 hole' : `${pour.holes.length} holes`}>
          {pour.holes.map((hole, index) => (
            <Wide key={JSON.stringify(hole[0])}>
              <div className="flex items-center justify-between gap-3 text-sm">
                <span>
                  Hole {index + 1}, {hole.length} corners
                </span>
                <Button
                  size="small"
                  disabled={disabled}
                  onClick={() => change('the holes', { holes: pour.holes.filter((_, place) => place !== index) })}
                >
                  Fill hole {index + 1}
                </Button>
              </div>
            </Wide>
          ))}
        </Group>
      ) : null}
    </>
  );
}

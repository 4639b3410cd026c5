import { changePart } from '#core/board/edits/change-part.ts';
import type { LandNet, Part } from '#core/board/part.ts';
import { SelectField } from '#web/ui/select-field.tsx';
import { useEditor } from '../editor-context.ts';
import { useEdit } from './use-edit.ts';

const options: readonly { value: LandNet; label: string }[] = [
  { value: 'ground', label: 'Ground net' },
  { value: 'input', label: 'Input net' },
  { value: 'output', label: 'Output net' },
  { value: 'none', label: 'on no net' },
];

/** Which net each land of the part lies on: it decides which copper may cool it. Holds for every regulator of this part. */
export function LandNetFields({ partKey, part }: { partKey: string; part: Part }) {
  const model = useEditor((state) => state.board.packages[part.package]);
  const { edit, disabled } = useEdit();
  return (model?.lands ?? []).map((land) => (
    <SelectField<LandNet>
      key={land.name}
      label={`Land ${land.name}`}
      value={part.landNets[land.name] ?? 'none'}
      options={options}
      disabled={disabled}
      onChange={(net) =>
        edit(`Put land ${land.name} of ${part.name} on another net`, (board) =>
          changePart(board, partKey, { landNets: { ...part.landNets, [land.name]: net } }),
        )
      }
    />
  ));
}

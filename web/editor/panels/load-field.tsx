import { changeCondition } from '#core/board/edits/change-condition.ts';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { useEditor } from '../editor-context.ts';
import { useEdit } from './use-edit.ts';

type Props = {
  /** Regulator whose output current, or heat source whose power, the condition states. */
  objectRef: string;
  field: 'loadsA' | 'powersW';
};

/** What the active condition says of one object; empty where it says nothing. */
export function LoadField({ objectRef, field }: Props) {
  const { edit, disabled } = useEdit();
  const condition = useEditor((state) =>
    state.board.conditions.find((candidate) => candidate.name === state.activeCondition),
  );
  if (!condition) return null;
  const isLoad = field === 'loadsA';
  return (
    <QuantityField
      label={`${isLoad ? 'Load' : 'Power'} in “${condition.name}”`}
      unit={isLoad ? 'A' : 'W'}
      value={condition[field][objectRef] ?? null}
      minimum={0}
      maximum={isLoad ? 200 : 500}
      optional
      disabled={disabled}
      onCommit={(value) => {
        const others = Object.entries(condition[field]).filter(([ref]) => ref !== objectRef);
        const values = Object.fromEntries(value === null ? others : [...others, [objectRef, value]]);
        edit(`Change the ${isLoad ? 'load' : 'power'} of ${objectRef} in ${condition.name}`, (board) =>
          changeCondition(board, condition.name, { [field]: values }),
        );
      }}
    />
  );
}

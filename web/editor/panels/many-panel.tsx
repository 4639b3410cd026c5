import { moveObjects } from '#core/board/edits/move-objects.ts';
import { rotateObjects } from '#core/board/edits/rotate-objects.ts';
import { useState } from 'react';
import { Button } from '#web/ui/button.tsx';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { type ObjectKey, objectName } from '#core/board/object-key.ts';
import { Group, Wide } from './group.tsx';
import { useEdit } from './use-edit.ts';

/** Several objects at once: moved and turned together by figures. */
export function ManyPanel({ keys }: { keys: readonly ObjectKey[] }) {
  const { edit, disabled } = useEdit();
  const [by, setBy] = useState({ x: 0, y: 0, angle: 90 });
  const what = `${keys.length} objects`;
  const shared = { unit: 'mm', minimum: -2000, maximum: 2000, disabled };
  return (
    <>
      <div className="border-b border-line px-4 py-3">
        <h2 className="text-base">{what} selected</h2>
        <p className="text-sm text-ink-soft">
          {keys
            .slice(0, 12)
            .map((key) => objectName(key))
            .join(', ')}
          {keys.length > 12 ? ` and ${keys.length - 12} more` : ''}
        </p>
      </div>
      <Group title="Move together">
        <QuantityField {...shared} label="By x" value={by.x} onCommit={(x) => x !== null && setBy({ ...by, x })} />
        <QuantityField {...shared} label="By y" value={by.y} onCommit={(y) => y !== null && setBy({ ...by, y })} />
        <Wide>
          <Button
            size="small"
            disabled={disabled || (by.x === 0 && by.y === 0)}
            onClick={() => edit(`Move ${what}`, (board) => moveObjects(board, keys, [by.x, by.y]))}
          >
            Move
          </Button>
        </Wide>
      </Group>
      <Group title="Turn about their common middle">
        <QuantityField
          label="Angle, counter-clockwise"
          unit="°"
          value={by.angle}
          minimum={-360}
          maximum={360}
          disabled={disabled}
          onCommit={(angle) => angle !== null && setBy({ ...by, angle })}
        />
        <div className="self-end">
          <Button
            size="small"
            disabled={disabled || by.angle === 0}
            onClick={() => edit(`Rotate ${what}`, (board) => rotateObjects(board, keys, by.angle))}
          >
            Turn
          </Button>
        </div>
      </Group>
    </>
  );
}

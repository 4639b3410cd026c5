import { type Alignment, alignObjects, alignments } from '#core/board/edits/align-objects.ts';
import { distributeObjects } from '#core/board/edits/distribute-objects.ts';
import { moveObjects } from '#core/board/edits/move-objects.ts';
import { rotateObjects } from '#core/board/edits/rotate-objects.ts';
import { useState } from 'react';
import { Button } from '#web/ui/button.tsx';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { type ObjectKey, objectName } from '#core/board/object-key.ts';
import { Group, Wide } from './group.tsx';
import { useEdit } from './use-edit.ts';

const alignmentWords: Record<Alignment, string> = {
  left: 'Left edges',
  centre: 'Centres, left to right',
  right: 'Right edges',
  top: 'Top edges',
  middle: 'Middles, top to bottom',
  bottom: 'Bottom edges',
};

/** Several objects at once: aligned, spread, moved and turned together by figures. */
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
      <Group title="Align">
        <Wide>
          <div className="flex flex-wrap gap-2">
            {alignments.map((to) => (
              <Button
                key={to}
                size="small"
                disabled={disabled}
                onClick={() => edit(`Align ${what}: ${alignmentWords[to]}`, (board) => alignObjects(board, keys, to))}
              >
                {alignmentWords[to]}
              </Button>
            ))}
          </div>
        </Wide>
      </Group>
      <Group title="Distribute with equal gaps">
        <Wide>
          {keys.length < 3 ? (
            <p className="text-sm text-ink-soft">
              Select three objects or more; the outermost two stay where they are.
            </p>
          ) : (
            <div className="flex flex-wrap gap-2">
              {(['x', 'y'] as const).map((axis) => (
                <Button
                  key={axis}
                  size="small"
                  disabled={disabled}
                  onClick={() =>
                    edit(`Distribute ${what} along ${axis}`, (board) => distributeObjects(board, keys, axis))
                  }
                >
                  Along {axis}
                </Button>
              ))}
            </div>
          )}
        </Wide>
      </Group>
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

import { scaleRing } from '#core/board/edits/scale-ring.ts';
import type { Ring } from '#core/board/outline.ts';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { type ObjectKey, objectName } from '#core/board/object-key.ts';
import { type Box, boxOf } from '#core/board/object-rings.ts';
import { Group } from './group.tsx';
import { useEdit } from './use-edit.ts';

/** Box around a polygon in figures; changing it moves or stretches the whole ring. */
export function RingBoxFields({ objectKey, ring }: { objectKey: ObjectKey; ring: Ring }) {
  const { edit, disabled } = useEdit();
  const box = boxOf([ring]);
  if (!box) return null;
  const name = objectName(objectKey);
  const set = (word: string, next: Partial<Box>) =>
    edit(`${word} ${name}`, (board) => scaleRing(board, objectKey, { ...box, ...next }));
  const place = { unit: 'mm', minimum: -2000, maximum: 2000, disabled };
  const size = { unit: 'mm', minimum: 0.1, maximum: 2000, disabled };
  const width = tidy(box.right - box.left);
  const height = tidy(box.top - box.bottom);
  return (
    <Group title="Place and size">
      <QuantityField
        {...place}
        label="Left, x"
        value={box.left}
        onCommit={(left) => left !== null && set('Move', { left, right: left + width })}
      />
      <QuantityField
        {...place}
        label="Bottom, y"
        value={box.bottom}
        onCommit={(bottom) => bottom !== null && set('Move', { bottom, top: bottom + height })}
      />
      <QuantityField
        {...size}
        label="Width"
        value={width}
        onCommit={(value) => value !== null && set('Stretch', { right: box.left + value })}
      />
      <QuantityField
        {...size}
        label="Height"
        value={height}
        onCommit={(value) => value !== null && set('Stretch', { top: box.bottom + value })}
      />
    </Group>
  );
}

function tidy(value: number): number {
  return Number(value.toPrecision(10));
}

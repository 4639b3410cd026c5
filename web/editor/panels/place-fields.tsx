import { moveObjects } from '#core/board/edits/move-objects.ts';
import { rotateObjects } from '#core/board/edits/rotate-objects.ts';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { type ObjectKey, objectName } from '#core/board/object-key.ts';
import { useEdit } from './use-edit.ts';

type Props = { objectKey: ObjectKey; at: readonly [number, number]; rotationDeg?: number };

/** Place of an object in figures, and its angle where it has one. */
export function PlaceFields({ objectKey, at, rotationDeg }: Props) {
  const { edit, disabled } = useEdit();
  const name = objectName(objectKey);
  const moveTo = (x: number, y: number) =>
    edit(`Move ${name}`, (board) => moveObjects(board, [objectKey], [x - at[0], y - at[1]]));
  return (
    <>
      <QuantityField
        label="x"
        unit="mm"
        value={at[0]}
        minimum={-2000}
        maximum={2000}
        disabled={disabled}
        onCommit={(x) => x !== null && moveTo(x, at[1])}
      />
      <QuantityField
        label="y"
        unit="mm"
        value={at[1]}
        minimum={-2000}
        maximum={2000}
        disabled={disabled}
        onCommit={(y) => y !== null && moveTo(at[0], y)}
      />
      {rotationDeg === undefined ? null : (
        <QuantityField
          label="Rotation, counter-clockwise"
          unit="°"
          value={rotationDeg}
          minimum={-360}
          maximum={360}
          disabled={disabled}
          onCommit={(angle) =>
            angle !== null && edit(`Rotate ${name}`, (board) => rotateObjects(board, [objectKey], angle - rotationDeg))
          }
        />
      )}
    </>
  );
}

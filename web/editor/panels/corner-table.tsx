import { insertCorner } from '#core/board/edits/insert-corner.ts';
import { moveCorner } from '#core/board/edits/move-corner.ts';
import { removeCorner } from '#core/board/edits/remove-corner.ts';
import type { Ring } from '#core/board/outline.ts';
import { Button } from '#web/ui/button.tsx';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { type ObjectKey, objectName } from '#core/board/object-key.ts';
import { useEdit } from './use-edit.ts';

const mostShown = 200;

/** Corners of a polygon in figures: changed, added and removed without a pointer on the canvas. */
export function CornerTable({ objectKey, ring }: { objectKey: ObjectKey; ring: Ring }) {
  const { edit, disabled } = useEdit();
  const name = objectName(objectKey);
  const field = (index: number, axis: 0 | 1) => (
    <QuantityField
      label={<span className="sr-only">{`${axis === 0 ? 'x' : 'y'} of corner ${index + 1}`}</span>}
      unit="mm"
      value={ring[index]?.[axis] ?? null}
      minimum={-2000}
      maximum={2000}
      disabled={disabled}
      onCommit={(value) => {
        const [x, y] = ring[index] ?? [0, 0];
        if (value !== null) {
          edit(`Move corner ${index + 1} of ${name}`, (board) =>
            moveCorner(board, objectKey, index, axis === 0 ? [value, y] : [x, value]),
          );
        }
      }}
    />
  );
  return (
    <details className="border-b border-line px-4 py-3">
      <summary className="min-h-6 text-sm font-semibold">{ring.length} corners</summary>
      <table className="mt-2 w-full text-sm [&_input]:min-h-8 [&_input]:text-sm">
        <thead>
          <tr className="text-left text-xs text-ink-soft">
            <th scope="col" className="w-8 font-normal">
              No.
            </th>
            <th scope="col" className="font-normal">
              x
            </th>
            <th scope="col" className="font-normal">
              y
            </th>
            <th scope="col">
              <span className="sr-only">Acts</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {ring.slice(0, mostShown).map((corner, index) => (
            // Corners have no identity but their place in the ring.
            <tr key={`${index} ${corner[0]} ${corner[1]}`}>
              <th scope="row" className="text-left font-normal">
                {index + 1}
              </th>
              <td className="pr-2 pb-1">{field(index, 0)}</td>
              <td className="pr-2 pb-1">{field(index, 1)}</td>
              <td className="pb-1 whitespace-nowrap">
                <Button
                  size="small"
                  variant="quiet"
                  disabled={disabled}
                  aria-label={`Add a corner after ${index + 1}`}
                  title="Add a corner after this one"
                  onClick={() => edit(`Add a corner to ${name}`, (board) => insertCorner(board, objectKey, index))}
                >
                  +
                </Button>
                <Button
                  size="small"
                  variant="quiet"
                  disabled={disabled || ring.length <= 3}
                  aria-label={`Remove corner ${index + 1}`}
                  title="Remove this corner"
                  onClick={() => edit(`Remove a corner of ${name}`, (board) => removeCorner(board, objectKey, index))}
                >
                  −
                </Button>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      {ring.length > mostShown ? (
        <p className="text-xs text-ink-soft">
          The first {mostShown} of {ring.length} corners.
        </p>
      ) : null}
    </details>
  );
}

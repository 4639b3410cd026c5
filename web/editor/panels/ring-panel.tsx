import type { Ring } from '#core/board/outline.ts';
import { type ObjectKey, objectName } from '#core/board/object-key.ts';
import { CornerTable } from './corner-table.tsx';
import { RingBoxFields } from './ring-box-fields.tsx';

/** Outline or cut-out in figures. */
export function RingPanel({ objectKey, ring }: { objectKey: ObjectKey; ring: Ring }) {
  return (
    <>
      <h2 className="px-4 pt-3 text-base">{objectName(objectKey)}</h2>
      <RingBoxFields objectKey={objectKey} ring={ring} />
      <CornerTable objectKey={objectKey} ring={ring} />
    </>
  );
}

import type { Board } from '#core/board/document.ts';
import { objectKey, objectName } from '#core/board/object-key.ts';

/** Names of the objects that lie on or end at a layer; while there are any, it cannot be removed. */
export function layerUsers(board: Board, layer: string): string[] {
  return [
    ...board.pours.filter((pour) => pour.layer === layer).map((pour) => objectName(objectKey('pour', pour.id))),
    ...board.viaFields
      .filter((field) => field.from === layer || field.to === layer)
      .map((field) => objectName(objectKey('via-field', field.id))),
    ...board.sinks.filter((sink) => sink.layer === layer).map((sink) => objectName(objectKey('sink', sink.id))),
  ];
}

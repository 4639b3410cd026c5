import type { Board } from '#core/board/document.ts';
import type { Point } from '#core/board/outline.ts';
import { freeId } from '../free-id.ts';
import { type ObjectKey, idOf, kindOf, objectKey, objectKeys } from '../object-key.ts';
import { moveObjects } from './move-objects.ts';

/** Copies of objects under new names, moved by a distance; loads and powers of the conditions are copied too. */
export function duplicateObjects(
  board: Board,
  keys: readonly ObjectKey[],
  by: Point,
): { board: Board; keys: ObjectKey[] } {
  let next = board;
  const copies: ObjectKey[] = [];
  for (const key of keys) {
    const copied = duplicated(next, key);
    if (!copied) continue;
    next = copied.board;
    copies.push(copied.key);
  }
  return { board: moveObjects(next, copies, by), keys: copies };
}

function duplicated(board: Board, key: ObjectKey): { board: Board; key: ObjectKey } | null {
  const id = idOf(key);
  const kind = kindOf(key);
  const name = freeId(id.replace(/\d+$/, '') || id, objectKeys(board).map(idOf));
  const copyKey = objectKey(kind, name);
  const again = <T>(list: T[], isMeant: (item: T) => boolean, rename: (item: T) => T): T[] => [
    ...list,
    ...list.filter(isMeant).map(rename),
  ];
  const conditions = (field: 'loadsA' | 'powersW') =>
    board.conditions.map((condition) => {
      const value = condition[field][id];
      return value === undefined ? condition : { ...condition, [field]: { ...condition[field], [name]: value } };
    });
  switch (kind) {
    case 'regulator': {
      const regulators = again(
        board.regulators,
        (item) => item.ref === id,
        (item) => ({ ...item, ref: name }),
      );
      return { key: copyKey, board: { ...board, regulators, conditions: conditions('loadsA') } };
    }
    case 'source': {
      const sources = again(
        board.sources,
        (item) => item.ref === id,
        (item) => ({ ...item, ref: name }),
      );
      return { key: copyKey, board: { ...board, sources, conditions: conditions('powersW') } };
    }
    case 'pour':
      return {
        key: copyKey,
        board: {
          ...board,
          pours: again(
            board.pours,
            (item) => item.id === id,
            (item) => ({ ...item, id: name }),
          ),
        },
      };
    case 'via-field': {
      const viaFields = again(
        board.viaFields,
        (item) => item.id === id,
        (item) => ({ ...item, id: name }),
      );
      return { key: copyKey, board: { ...board, viaFields } };
    }
    case 'sink':
      return {
        key: copyKey,
        board: {
          ...board,
          sinks: again(
            board.sinks,
            (item) => item.id === id,
            (item) => ({ ...item, id: name }),
          ),
        },
      };
    case 'probe':
      return {
        key: copyKey,
        board: {
          ...board,
          probes: again(
            board.probes,
            (item) => item.id === id,
            (item) => ({ ...item, id: name }),
          ),
        },
      };
    case 'cutout': {
      const ring = board.outline.cutouts[Number(id)];
      if (!ring) return null;
      const cutouts = [...board.outline.cutouts, ring];
      return {
        key: objectKey('cutout', cutouts.length - 1),
        board: { ...board, outline: { ...board.outline, cutouts } },
      };
    }
    case 'outline':
      return null;
  }
}

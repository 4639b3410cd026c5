import type { Board } from '#core/board/document.ts';
import { type ObjectKey, idOf, kindOf, objectKeys } from '../object-key.ts';
import { replaced } from './in-list.ts';
import { renamedKey } from './keyed.ts';

/** Another reference or id, followed by everything that names the object. The same board where the name is taken. */
export function renameObject(board: Board, key: ObjectKey, name: string): Board {
  const id = idOf(key);
  if (objectKeys(board).some((other) => idOf(other) === name)) return board;
  switch (kindOf(key)) {
    case 'regulator':
      return {
        ...board,
        regulators: replaced(
          board.regulators,
          (item) => item.ref === id || (item.feed !== null && 'regulator' in item.feed && item.feed.regulator === id),
          (item) => (item.ref === id ? { ...item, ref: name } : { ...item, feed: { regulator: name } }),
        ),
        conditions: replaced(
          board.conditions,
          ({ loadsA, fault }) => id in loadsA || (fault?.kind === 'output-short' && fault.ref === id),
          (condition) => ({
            ...condition,
            loadsA: renamedKey(condition.loadsA, id, name),
            fault:
              condition.fault?.kind === 'output-short' && condition.fault.ref === id
                ? { ...condition.fault, ref: name }
                : condition.fault,
          }),
        ),
      };
    case 'source':
      return {
        ...board,
        sources: replaced(
          board.sources,
          (item) => item.ref === id,
          (item) => ({ ...item, ref: name }),
        ),
        regulators: replaced(
          board.regulators,
          (item) => item.dropper?.source === id,
          (item) => ({ ...item, dropper: item.dropper && { ...item.dropper, source: name } }),
        ),
        conditions: replaced(
          board.conditions,
          (condition) => id in condition.powersW,
          (condition) => ({ ...condition, powersW: renamedKey(condition.powersW, id, name) }),
        ),
      };
    case 'pour':
      return {
        ...board,
        pours: replaced(
          board.pours,
          (item) => item.id === id,
          (item) => ({ ...item, id: name }),
        ),
      };
    case 'via-field':
      return {
        ...board,
        viaFields: replaced(
          board.viaFields,
          (item) => item.id === id,
          (item) => ({ ...item, id: name }),
        ),
      };
    case 'sink':
      return {
        ...board,
        sinks: replaced(
          board.sinks,
          (item) => item.id === id,
          (item) => ({ ...item, id: name }),
        ),
      };
    case 'probe':
      return {
        ...board,
        probes: replaced(
          board.probes,
          (item) => item.id === id,
          (item) => ({ ...item, id: name }),
        ),
      };
    default:
      return board;
  }
}

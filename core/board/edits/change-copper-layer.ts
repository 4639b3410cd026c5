import type { Board } from '#core/board/document.ts';
import type { CopperLayer } from '#core/board/stackup.ts';
import { replaced } from './in-list.ts';

/** Changes one copper layer; under another name everything that lies on it follows. The same board where that name is taken. */
export function changeCopperLayer(board: Board, index: number, patch: Partial<CopperLayer>): Board {
  const before = board.stackup.copper[index];
  if (!before) return board;
  const after = { ...before, ...patch };
  if (board.stackup.copper.some((layer, place) => place !== index && layer.name === after.name)) return board;
  const copper = board.stackup.copper.map((layer, place) => (place === index ? after : layer));
  const next = { ...board, stackup: { ...board.stackup, copper } };
  if (after.name === before.name) return next;
  const isIt = (name: string) => name === before.name;
  const follow = (name: string) => (isIt(name) ? after.name : name);
  return {
    ...next,
    pours: replaced(
      board.pours,
      (pour) => isIt(pour.layer),
      (pour) => ({ ...pour, layer: after.name }),
    ),
    viaFields: replaced(
      board.viaFields,
      (field) => isIt(field.from) || isIt(field.to),
      (field) => ({ ...field, from: follow(field.from), to: follow(field.to) }),
    ),
    sinks: replaced(
      board.sinks,
      (sink) => isIt(sink.layer),
      (sink) => ({ ...sink, layer: after.name }),
    ),
  };
}

import type { Board } from '#core/board/document.ts';
import type { CopperLayer } from '#core/board/stackup.ts';

/** Changes one copper layer; under another name everything that lies on it follows. */
export function changeCopperLayer(board: Board, index: number, patch: Partial<CopperLayer>): Board {
  const before = board.stackup.copper[index];
  if (!before) return board;
  const after = { ...before, ...patch };
  const copper = board.stackup.copper.map((layer, place) => (place === index ? after : layer));
  const next = { ...board, stackup: { ...board.stackup, copper } };
  if (after.name === before.name) return next;
  const follow = (name: string) => (name === before.name ? after.name : name);
  return {
    ...next,
    pours: board.pours.map((pour) => ({ ...pour, layer: follow(pour.layer) })),
    viaFields: board.viaFields.map((field) => ({ ...field, from: follow(field.from), to: follow(field.to) })),
    sinks: board.sinks.map((sink) => ({ ...sink, layer: follow(sink.layer) })),
  };
}

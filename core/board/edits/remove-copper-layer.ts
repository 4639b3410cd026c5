import type { ViaField } from '#core/board/copper.ts';
import type { Board } from '#core/board/document.ts';
import { without } from './in-list.ts';

/**
 * Takes a copper layer and the laminate below it (above it for the last one) out, with the pours and sinks on it. A via
 * field that ended on it ends on the next layer inwards, or goes when it would join nothing. The same board where it is
 * the only layer.
 */
export function removeCopperLayer(board: Board, index: number): Board {
  const { copper, dielectric } = board.stackup;
  const layer = copper[index];
  if (copper.length <= 1 || !layer) return board;
  const laminate = Math.min(index, dielectric.length - 1);
  const order = copper.map(({ name }) => name);
  return {
    ...board,
    stackup: { ...board.stackup, copper: copper.toSpliced(index, 1), dielectric: dielectric.toSpliced(laminate, 1) },
    pours: without(board.pours, (pour) => pour.layer === layer.name),
    sinks: without(board.sinks, (sink) => sink.layer === layer.name),
    viaFields: board.viaFields.some((field) => field.from === layer.name || field.to === layer.name)
      ? board.viaFields.flatMap((field) => shortened(field, order, index))
      : board.viaFields,
  };
}

function shortened(field: ViaField, order: readonly string[], gone: number): ViaField[] {
  const from = order.indexOf(field.from) + (field.from === order[gone] ? 1 : 0);
  const to = order.indexOf(field.to) - (field.to === order[gone] ? 1 : 0);
  if (from >= to) return [];
  return from === order.indexOf(field.from) && to === order.indexOf(field.to)
    ? [field]
    : [{ ...field, from: order[from]!, to: order[to]! }];
}

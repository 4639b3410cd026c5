import { conductanceSums } from '#core/numerics/layered-network.ts';
import type { BoardModel } from '#core/thermal/board-model.ts';

/** Diagonal of the matrix that a model stands at after its last solution; a node without any conductance stands alone. */
export function assembledDiagonal({ network }: BoardModel): Float64Array {
  return conductanceSums(network).map((sum, node) => sum + network.anchor[node]! || 1);
}

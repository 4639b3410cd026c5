import { cellCount, type LayeredNetwork } from './layered-network.ts';

/** Factors of every column's tridiagonal block: 1/d of LDLᵀ. Links inside a column stay on the right side. */
export function factorLines(network: LayeredNetwork, diagonal: Float64Array, inverse: Float64Array) {
  const { layers, gz } = network;
  const cells = cellCount(network);
  for (let base = 0; base < cells; base += layers) {
    let previous = 0;
    for (let l = 0; l < layers; l++) {
      const n = base + l;
      const below = l > 0 ? gz[n - 1]! : 0;
      previous = 1 / (diagonal[n]! - below * below * previous);
      inverse[n] = previous;
    }
  }
  for (let n = cells; n < diagonal.length; n++) inverse[n] = 1 / diagonal[n]!;
}

/** One half sweep of red-black line Gauss–Seidel over the columns with (i + j) mod 2 = colour. */
export function smoothColumns(
  network: LayeredNetwork,
  inverse: Float64Array,
  b: Float64Array,
  x: Float64Array,
  colour: 0 | 1,
) {
  const { columns, rows, layers, gx, gy, gz, links } = network;
  const sy = columns * layers;
  const cells = rows * sy;
  const { start, node, g } = links;
  const before = new Float64Array(layers);
  for (let j = 0; j < rows; j++) {
    const inner = j > 0 && j + 1 < rows;
    for (let i = (j + colour) & 1; i < columns; i += 2) {
      const base = j * sy + i * layers;
      const end = base + layers;
      const linked = start[end]! > start[base]!;
      if (linked) for (let l = 0; l < layers; l++) before[l] = x[base + l]!;
      let carried = 0;
      for (let n = base; n < end; n++) {
        let s = b[n]!;
        if (inner) {
          // Conductances are 0 at every far edge, so that inside the array no border needs a test.
          s +=
            gx[n - layers]! * x[n - layers]! + gx[n]! * x[n + layers]! + gy[n - sy]! * x[n - sy]! + gy[n]! * x[n + sy]!;
        } else {
          if (i > 0) s += gx[n - layers]! * x[n - layers]!;
          if (i + 1 < columns) s += gx[n]! * x[n + layers]!;
          if (n >= sy) s += gy[n - sy]! * x[n - sy]!;
          if (n + sy < cells) s += gy[n]! * x[n + sy]!;
        }
        if (linked) {
          for (let k = start[n]!; k < start[n + 1]!; k++) {
            // A link inside the column takes the value from before the sweep, which keeps the sweep symmetric.
            const inside = node[k]! - base;
            s += g[k]! * (inside >= 0 && inside < layers ? before[inside]! : x[node[k]!]!);
          }
        }
        if (n > base) s += gz[n - 1]! * carried;
        carried = s * inverse[n]!;
        // The forward value is kept in x: nothing of this column is read again before the back substitution.
        x[n] = carried;
      }
      for (let n = end - 2; n >= base; n--) x[n]! += gz[n]! * inverse[n]! * x[n + 1]!;
    }
  }
}

/** Gauss–Seidel over the extra nodes, forward or backward. */
export function smoothExtras(
  network: LayeredNetwork,
  inverse: Float64Array,
  b: Float64Array,
  x: Float64Array,
  backward: boolean,
) {
  const cells = cellCount(network);
  const { start, node, g } = network.links;
  for (let e = 0; e < network.extras; e++) {
    const n = cells + (backward ? network.extras - 1 - e : e);
    let s = b[n]!;
    for (let k = start[n]!; k < start[n + 1]!; k++) s += g[k]! * x[node[k]!]!;
    x[n] = s * inverse[n]!;
  }
}

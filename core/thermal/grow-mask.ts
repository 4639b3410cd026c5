/**
 * Grows the marked cells of a row-major mask by `steps` cells in x and y (a square neighbourhood).
 * @param border whether cells beyond the mask count as marked
 */
export function growMask(mask: Uint8Array, columns: number, steps: number, border: boolean): Uint8Array {
  if (steps <= 0) return mask.slice();
  const rows = mask.length / columns;
  const across = sweep(mask, rows, columns, columns, 1, steps, border);
  return sweep(across, columns, rows, 1, columns, steps, border);
}

/** One direction: a cell is marked when a marked one lies within `steps` along its line. */
function sweep(
  mask: Uint8Array,
  lines: number,
  length: number,
  lineStride: number,
  stride: number,
  steps: number,
  border: boolean,
) {
  const grown = new Uint8Array(mask.length);
  for (let line = 0; line < lines; line++) {
    const start = line * lineStride;
    let since = border ? 1 : Infinity;
    for (let i = 0; i < length; i++) {
      const at = start + i * stride;
      since = mask[at] ? 0 : since + (i === 0 && border ? 0 : 1);
      if (since <= steps) grown[at] = 1;
    }
    since = border ? 1 : Infinity;
    for (let i = length - 1; i >= 0; i--) {
      const at = start + i * stride;
      since = mask[at] ? 0 : since + (i === length - 1 && border ? 0 : 1);
      if (since <= steps) grown[at] = 1;
    }
  }
  return grown;
}

import type { HeatFieldView } from '#core/contract/solving.ts';
import type { HeatField } from '#core/thermal/heat-field.ts';

/** Heat field as the server sends it (base64 of little-endian Float32) to the arrays that bands and isotherms are drawn from. */
export function decodeHeatField(view: HeatFieldView): HeatField {
  return {
    columns: view.columns,
    rows: view.rows,
    xEdgesMm: Float64Array.from(view.xEdgesMm),
    yEdgesMm: Float64Array.from(view.yEdgesMm),
    layers: view.layers.map((layer) => ({ name: layer.name, temperatureC: floats(layer.temperatureC) })),
  };
}

function floats(base64: string): Float32Array {
  const text = atob(base64);
  const bytes = Uint8Array.from(text, (character) => character.charCodeAt(0));
  const view = new DataView(bytes.buffer);
  return Float32Array.from({ length: Math.floor(bytes.length / 4) }, (_, index) => view.getFloat32(index * 4, true));
}

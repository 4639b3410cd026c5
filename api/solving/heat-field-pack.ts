import { gunzipSync, gzipSync } from 'node:zlib';
import type { HeatField } from '#core/thermal/heat-field.ts';

type Head = { columns: number; rows: number; xEdgesMm: number[]; yEdgesMm: number[]; layers: string[] };

/**
 * Heat field as it is stored: a JSON head with its length (32 bits, little-endian), then one Float32 (little-endian) per
 * cell and layer, the whole by gzip. Only the outer layers are kept; they are what can be seen and measured.
 */
export function packHeatField(field: HeatField): Uint8Array {
  const [top] = field.layers;
  const bottom = field.layers.at(-1);
  const layers = [...new Set([top, bottom])].filter((layer) => layer !== undefined);
  const head: Head = {
    columns: field.columns,
    rows: field.rows,
    xEdgesMm: [...field.xEdgesMm],
    yEdgesMm: [...field.yEdgesMm],
    layers: layers.map(({ name }) => name),
  };
  const text = Buffer.from(JSON.stringify(head));
  const size = Buffer.alloc(4);
  size.writeUInt32LE(text.length);
  const cells = layers.map(({ temperatureC }) => littleEndian(temperatureC));
  return gzipSync(Buffer.concat([size, text, ...cells]));
}

export function unpackHeatField(packed: Uint8Array): HeatField {
  const bytes = gunzipSync(packed);
  const size = bytes.readUInt32LE(0);
  const head = JSON.parse(bytes.toString('utf8', 4, 4 + size)) as Head;
  const cells = head.columns * head.rows;
  return {
    columns: head.columns,
    rows: head.rows,
    xEdgesMm: Float64Array.from(head.xEdgesMm),
    yEdgesMm: Float64Array.from(head.yEdgesMm),
    layers: head.layers.map((name, index) => {
      const start = 4 + size + index * cells * 4;
      const temperatureC = new Float32Array(cells);
      for (let cell = 0; cell < cells; cell++) temperatureC[cell] = bytes.readFloatLE(start + cell * 4);
      return { name, temperatureC };
    }),
  };
}

export function littleEndian(values: Float32Array): Buffer {
  const bytes = Buffer.alloc(values.length * 4);
  values.forEach((value, index) => bytes.writeFloatLE(value, index * 4));
  return bytes;
}

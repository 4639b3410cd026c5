import { z } from 'zod';
import type { Board } from './document.ts';
import { type ObjectKey, idOf, kindOf } from './object-key.ts';
import { packageModel } from './package.ts';
import { part } from './part.ts';
import { heatSource, probe, regulator } from './placement.ts';
import { pour, sink, viaField } from './copper.ts';
import { name } from './name.ts';

/** Objects copied from a board, self-contained: the parts and packages they use travel with them. Written as JSON text. */
export const objectClipping = z.strictObject({
  format: z.literal('dropwatt-objects'),
  version: z.literal(1),
  pours: z.array(pour).default([]),
  viaFields: z.array(viaField).default([]),
  regulators: z.array(regulator).default([]),
  sources: z.array(heatSource).default([]),
  sinks: z.array(sink).default([]),
  probes: z.array(probe).default([]),
  parts: z.record(name, part).default({}),
  packages: z.record(name, packageModel).default({}),
});
export type ObjectClipping = z.output<typeof objectClipping>;

/** What is copied of the named objects; outline and cut-outs belong to their board and stay there. */
export function clippingOf(board: Board, keys: readonly ObjectKey[]): ObjectClipping {
  const named = (kind: string) => new Set(keys.filter((key) => kindOf(key) === kind).map(idOf));
  const kept = <T>(list: readonly T[], kind: string, id: (item: T) => string): T[] => {
    const ids = named(kind);
    return list.filter((item) => ids.has(id(item)));
  };
  const regulators = kept(board.regulators, 'regulator', (item) => item.ref);
  const used = new Set(regulators.map((item) => item.part));
  const parts = Object.fromEntries(Object.entries(board.parts).filter(([key]) => used.has(key)));
  const bodies = new Set(Object.values(parts).map((each) => each.package));
  return {
    format: 'dropwatt-objects',
    version: 1,
    pours: kept(board.pours, 'pour', (item) => item.id),
    viaFields: kept(board.viaFields, 'via-field', (item) => item.id),
    regulators,
    sources: kept(board.sources, 'source', (item) => item.ref),
    sinks: kept(board.sinks, 'sink', (item) => item.id),
    probes: kept(board.probes, 'probe', (item) => item.id),
    parts,
    packages: Object.fromEntries(Object.entries(board.packages).filter(([key]) => bodies.has(key))),
  };
}

/** @returns the clipping that a text holds; null where it is something else or a part of it is not valid */
export function readClipping(text: string): ObjectClipping | null {
  try {
    const reading = objectClipping.safeParse(JSON.parse(text));
    return reading.success ? reading.data : null;
  } catch {
    return null;
  }
}

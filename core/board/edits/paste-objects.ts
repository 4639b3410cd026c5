import type { Board } from '../document.ts';
import { freeId } from '../free-id.ts';
import type { ObjectClipping } from '../object-clipping.ts';
import { type ObjectKey, idOf, objectKey, objectKeys } from '../object-key.ts';
import type { Point } from '../outline.ts';
import type { Regulator } from '../placement.ts';
import { moveObjects } from './move-objects.ts';

export type Pasted = {
  board: Board;
  keys: ObjectKey[];
  /** What could not come along, in words. */
  dropped: string[];
};

/**
 * Adds copied objects under new names, moved by a distance (mm) but unchanged to one another. Feeds and droppers among
 * the copies follow the new names; a feed from a supply stays where this board has one of that name, else it is left
 * open; copper of a layer that this board lacks goes to its first. Loads and powers of conditions do not come along.
 */
export function pasteObjects(board: Board, clipping: ObjectClipping, by: Point): Pasted {
  const taken = objectKeys(board).map(idOf);
  const dropped: string[] = [];
  const fresh = <T>(items: readonly T[], idOfItem: (item: T) => string) =>
    new Map(
      items.map((item) => {
        const old = idOfItem(item);
        const id = taken.includes(old) ? freeId(old.replace(/\d+$/, '') || old, taken) : old;
        taken.push(id);
        return [old, id];
      }),
    );
  const refs = fresh(clipping.regulators, (item) => item.ref);
  const sources = fresh(clipping.sources, (item) => item.ref);
  const pours = fresh(clipping.pours, (item) => item.id);
  const fields = fresh(clipping.viaFields, (item) => item.id);
  const sinks = fresh(clipping.sinks, (item) => item.id);
  const probes = fresh(clipping.probes, (item) => item.id);
  const packageNames = freeNames(board.packages, clipping.packages);
  const packages = renamed(clipping.packages, packageNames);
  const parts = Object.fromEntries(
    Object.entries(clipping.parts).map(([key, part]) => [
      key,
      { ...part, package: packageNames.get(part.package) ?? part.package },
    ]),
  );
  const partNames = freeNames(board.parts, parts);
  const layers = board.stackup.copper.map((each) => each.name);
  const layer = (name: string, what: string, instead = layers[0] ?? name) => {
    if (layers.includes(name)) return name;
    dropped.push(`layer ${name} of ${what}, now on ${instead}`);
    return instead;
  };
  const supplies = board.supplies.map((supply) => supply.name);

  const regulatorCopy = (item: Regulator): Regulator => {
    const ref = refs.get(item.ref) ?? item.ref;
    const { feed, dropper } = item;
    const feeder = feed && 'regulator' in feed ? refs.get(feed.regulator) : undefined;
    const kept = feed && 'supply' in feed && supplies.includes(feed.supply) ? feed : null;
    if (feed && !feeder && !kept) dropped.push(`the feed of ${ref}`);
    const heated = dropper?.source === undefined ? undefined : sources.get(dropper.source);
    if (dropper?.source !== undefined && !heated) dropped.push(`the heat source of the dropper of ${ref}`);
    const { source: _gone, ...plain } = dropper ?? {};
    return {
      ...item,
      ref,
      part: partNames.get(item.part) ?? item.part,
      feed: feeder ? { regulator: feeder } : kept,
      dropper: dropper ? { ...plain, ...(heated ? { source: heated } : {}) } : null,
    };
  };
  const id = (ids: Map<string, string>, old: string) => ids.get(old) ?? old;
  const keys = [
    ...[...refs.values()].map((ref) => objectKey('regulator', ref)),
    ...[...sources.values()].map((ref) => objectKey('source', ref)),
    ...[...pours.values()].map((each) => objectKey('pour', each)),
    ...[...fields.values()].map((each) => objectKey('via-field', each)),
    ...[...sinks.values()].map((each) => objectKey('sink', each)),
    ...[...probes.values()].map((each) => objectKey('probe', each)),
  ];
  const added: Board = {
    ...board,
    parts: { ...board.parts, ...renamed(parts, partNames) },
    packages: { ...board.packages, ...packages },
    regulators: [...board.regulators, ...clipping.regulators.map(regulatorCopy)],
    sources: [...board.sources, ...clipping.sources.map((item) => ({ ...item, ref: id(sources, item.ref) }))],
    pours: [
      ...board.pours,
      ...clipping.pours.map((item) => ({
        ...item,
        id: id(pours, item.id),
        layer: layer(item.layer, `pour ${id(pours, item.id)}`),
      })),
    ],
    viaFields: [
      ...board.viaFields,
      ...clipping.viaFields.map((item) => ({
        ...item,
        id: id(fields, item.id),
        from: layer(item.from, `via field ${id(fields, item.id)}`),
        to: layer(item.to, `via field ${id(fields, item.id)}`, layers.at(-1)),
      })),
    ],
    sinks: [
      ...board.sinks,
      ...clipping.sinks.map((item) => ({
        ...item,
        id: id(sinks, item.id),
        layer: layer(item.layer, `sink ${id(sinks, item.id)}`),
      })),
    ],
    probes: [...board.probes, ...clipping.probes.map((item) => ({ ...item, id: id(probes, item.id) }))],
  };
  return { board: keys.length === 0 ? board : moveObjects(added, keys, by), keys, dropped };
}

/** Names for library entries: the old one where it is free or means the very same data, else with a number. */
function freeNames(
  own: Readonly<Record<string, unknown>>,
  brought: Readonly<Record<string, unknown>>,
): Map<string, string> {
  const taken = Object.keys(own);
  return new Map(
    Object.entries(brought).map(([name, value]) => {
      const isFree = !(name in own) || JSON.stringify(own[name]) === JSON.stringify(value);
      const free = isFree ? name : freeId(`${name} `, [...taken, ...Object.keys(brought)]);
      taken.push(free);
      return [name, free];
    }),
  );
}

function renamed<T>(record: Readonly<Record<string, T>>, names: ReadonlyMap<string, string>): Record<string, T> {
  return Object.fromEntries(Object.entries(record).map(([name, value]) => [names.get(name) ?? name, value]));
}

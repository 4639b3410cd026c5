import type { Board } from '#core/board/document.ts';
import type { Dropper } from '#core/board/placement.ts';
import { type ObjectKey, idOf, kindOf } from '../object-key.ts';

/** Removes objects and what was said about them in the conditions; feeds that named them become not stated. The outline cannot go. */
export function deleteObjects(board: Board, keys: readonly ObjectKey[]): Board {
  const ids = (kind: string) => new Set(keys.filter((key) => kindOf(key) === kind).map(idOf));
  const without = <T>(list: T[], kind: string, id: (item: T, index: number) => string): T[] => {
    const gone = ids(kind);
    return gone.size === 0 ? list : list.filter((item, index) => !gone.has(id(item, index)));
  };
  const regulators = ids('regulator');
  const sources = ids('source');
  return {
    ...board,
    regulators: without(board.regulators, 'regulator', (item) => item.ref).map((item) => ({
      ...item,
      feed: item.feed && 'regulator' in item.feed && regulators.has(item.feed.regulator) ? null : item.feed,
      dropper: item.dropper?.source && sources.has(item.dropper.source) ? withoutSource(item.dropper) : item.dropper,
    })),
    sources: without(board.sources, 'source', (item) => item.ref),
    pours: without(board.pours, 'pour', (item) => item.id),
    viaFields: without(board.viaFields, 'via-field', (item) => item.id),
    sinks: without(board.sinks, 'sink', (item) => item.id),
    probes: without(board.probes, 'probe', (item) => item.id),
    outline: { ...board.outline, cutouts: without(board.outline.cutouts, 'cutout', (_, index) => String(index)) },
    conditions: board.conditions.map((condition) => ({
      ...condition,
      loadsA: withoutKeys(condition.loadsA, regulators),
      powersW: withoutKeys(condition.powersW, sources),
      fault: condition.fault?.kind === 'output-short' && regulators.has(condition.fault.ref) ? null : condition.fault,
    })),
  };
}

function withoutSource({ resistanceOhm, dropV }: Dropper): Dropper {
  return { ...(resistanceOhm !== undefined && { resistanceOhm }), ...(dropV !== undefined && { dropV }) };
}

function withoutKeys(record: Record<string, number>, gone: ReadonlySet<string>): Record<string, number> {
  return Object.fromEntries(Object.entries(record).filter(([key]) => !gone.has(key)));
}

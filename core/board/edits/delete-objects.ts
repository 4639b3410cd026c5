import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import type { Dropper, Regulator } from '#core/board/placement.ts';
import { type ObjectKey, idOf, kindOf } from '../object-key.ts';
import { replaced, without } from './in-list.ts';
import { withoutKeys } from './keyed.ts';

/**
 * Removes objects and what was said about them in the conditions; feeds that named them become not stated. The outline
 * cannot go. What is not touched stays the very same.
 */
export function deleteObjects(board: Board, keys: readonly ObjectKey[]): Board {
  const ids = (kind: string) => new Set(keys.filter((key) => kindOf(key) === kind).map(idOf));
  const [regulators, sources, cutouts] = [ids('regulator'), ids('source'), ids('cutout')];
  const [pours, viaFields, sinks, probes] = [ids('pour'), ids('via-field'), ids('sink'), ids('probe')];
  const kept = without(board.regulators, (item) => regulators.has(item.ref));
  return {
    ...board,
    regulators: replaced(
      kept,
      () => true,
      (item) => freed(item, regulators, sources),
    ),
    sources: without(board.sources, (item) => sources.has(item.ref)),
    pours: without(board.pours, (item) => pours.has(item.id)),
    viaFields: without(board.viaFields, (item) => viaFields.has(item.id)),
    sinks: without(board.sinks, (item) => sinks.has(item.id)),
    probes: without(board.probes, (item) => probes.has(item.id)),
    outline:
      cutouts.size === 0
        ? board.outline
        : { ...board.outline, cutouts: without(board.outline.cutouts, (_, index) => cutouts.has(String(index))) },
    conditions: replaced(
      board.conditions,
      () => true,
      (item) => forgetting(item, regulators, sources),
    ),
  };
}

type Gone = ReadonlySet<string>;

function freed(item: Regulator, regulators: Gone, sources: Gone): Regulator {
  const fedByGone = item.feed !== null && 'regulator' in item.feed && regulators.has(item.feed.regulator);
  const heatsGone = item.dropper?.source !== undefined && sources.has(item.dropper.source);
  if (!fedByGone && !heatsGone) return item;
  return {
    ...item,
    feed: fedByGone ? null : item.feed,
    dropper: heatsGone && item.dropper ? withoutSource(item.dropper) : item.dropper,
  };
}

function forgetting(item: Condition, regulators: Gone, sources: Gone): Condition {
  const loadsA = withoutKeys(item.loadsA, regulators);
  const powersW = withoutKeys(item.powersW, sources);
  const fault = item.fault?.kind === 'output-short' && regulators.has(item.fault.ref) ? null : item.fault;
  if (loadsA === item.loadsA && powersW === item.powersW && fault === item.fault) return item;
  return { ...item, loadsA, powersW, fault };
}

function withoutSource({ resistanceOhm, dropV }: Dropper): Dropper {
  return { ...(resistanceOhm !== undefined && { resistanceOhm }), ...(dropV !== undefined && { dropV }) };
}

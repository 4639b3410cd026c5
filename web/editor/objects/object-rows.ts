import type { Board } from '#core/board/document.ts';
import type { ConditionResult, Verdict } from '#core/result/result.ts';
import { type ObjectKey, idOf, kindOf, objectKeys } from '#core/board/object-key.ts';
import { positionOf } from '#core/board/object-rings.ts';

/** One line of the object list: the canvas's twin for reading. */
export type ObjectRow = {
  key: ObjectKey;
  net: string;
  layer: string;
  xMm: number | null;
  yMm: number | null;
  temperatureC: number | null;
  verdict: Verdict | null;
};

export function objectRows(board: Board, condition: ConditionResult | null): ObjectRow[] {
  return objectKeys(board).map((key) => {
    const at = positionOf(board, key);
    return {
      key,
      ...copperOf(board, key),
      xMm: at?.[0] ?? null,
      yMm: at?.[1] ?? null,
      ...heatOf(condition, key),
    };
  });
}

function copperOf(board: Board, key: ObjectKey): { net: string; layer: string } {
  const id = idOf(key);
  const face = { top: board.stackup.copper[0]?.name ?? '', bottom: board.stackup.copper.at(-1)?.name ?? '' };
  switch (kindOf(key)) {
    case 'regulator': {
      const regulator = board.regulators.find((item) => item.ref === id);
      return regulator ? { net: regulator.nets.output, layer: face[regulator.side] } : none;
    }
    case 'source': {
      const source = board.sources.find((item) => item.ref === id);
      return { net: '', layer: source ? face[source.side] : '' };
    }
    case 'probe': {
      const probe = board.probes.find((item) => item.id === id);
      return { net: '', layer: probe ? face[probe.side] : '' };
    }
    case 'pour':
      return board.pours.find((item) => item.id === id) ?? none;
    case 'via-field': {
      const field = board.viaFields.find((item) => item.id === id);
      return field ? { net: field.net, layer: `${field.from}–${field.to}` } : none;
    }
    case 'sink':
      return { net: '', layer: board.sinks.find((item) => item.id === id)?.layer ?? '' };
    default:
      return none;
  }
}

const none = { net: '', layer: '' };

function heatOf(condition: ConditionResult | null, key: ObjectKey): Pick<ObjectRow, 'temperatureC' | 'verdict'> {
  const id = idOf(key);
  const kind = kindOf(key);
  const regulator = kind === 'regulator' && condition?.regulators.find((item) => item.ref === id);
  if (regulator) return { temperatureC: regulator.junctionC, verdict: regulator.verdict };
  const source = kind === 'source' && condition?.sources.find((item) => item.ref === id);
  if (source) return { temperatureC: source.temperatureC, verdict: source.verdict };
  const probe = kind === 'probe' && condition?.probes.find((item) => item.id === id);
  return { temperatureC: probe ? probe.temperatureC : null, verdict: null };
}

import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import type { Regulator } from '#core/board/placement.ts';
import { atCurrent } from './current-table.ts';
import { orderByFeed } from './feed-order.ts';
import type { OperatingPoint } from './operating-point.ts';
import { operatingPoints } from './operating-points.ts';
import { isShorted } from './output-currents.ts';

/** What a rail does in a condition; `starves`: regulates at the highest input and not at the lowest. */
export type RailState = 'regulates' | 'starves' | 'out of regulation' | 'shorted' | 'not evaluated';

/** One rail with both of its corners side by side; designers' units, null where an input is missing. */
export type Rail = {
  ref: string;
  /** Net of the output; null where the regulator names none. */
  net: string | null;
  /** Name of the supply or reference of the regulator that feeds it. */
  source: string | null;
  /** At the pin, after the dropper. */
  inputV: { lowest: number | null; nominal: number | null; highest: number | null };
  /** At the heat corner: the lowest output within the tolerance, or what dropout leaves. */
  outputV: number | null;
  outputA: number | null;
  /** What it draws from its source: output and ground current. */
  inputA: number | null;
  headroomV: number | null;
  /** Heat at the highest input with the lowest output. */
  heatW: number | null;
  /** Heat at the lowest input; in dropout the output has followed the input. */
  lowInputHeatW: number | null;
  /** Output power ÷ power drawn from the source at the heat corner, 0 to 1; a dropper counts as loss. */
  efficiency: number | null;
  /** Ground current ÷ input current, 0 to 1. */
  quiescentShare: number | null;
  state: RailState;
};

/** Every rail of a board in one condition, each after the rail that feeds it. */
export function railTable(board: Board, condition: Condition): Rail[] {
  const points = operatingPoints(board, condition);
  const nominals = new Map<string, number | null>();
  return orderByFeed(board.regulators).map((regulator) => {
    const point = points.get(regulator.ref)!;
    const part = board.parts[regulator.part]!;
    const isShort = isShorted(condition, regulator);
    const inputA = point.outputA === null || point.groundA === null ? null : point.outputA + point.groundA;
    const nominal = nominalInput(board, condition, regulator, inputA, nominals);
    const dropoutV = atCurrent(part.dropoutV, point.outputA ?? 0);
    nominals.set(
      regulator.ref,
      isShort ? 0 : nominal === null ? null : Math.min(part.outputV, Math.max(0, nominal - dropoutV)),
    );
    const isDrawing = inputA !== null && inputA > 0;
    return {
      ref: regulator.ref,
      net: regulator.nets.output ?? null,
      source: regulator.feed ? Object.values(regulator.feed)[0]! : null,
      inputV: { lowest: point.lowestInputV, nominal, highest: point.inputV },
      outputV: point.outputV,
      outputA: point.outputA,
      inputA,
      headroomV: point.headroomV,
      heatW: point.dissipationW,
      lowInputHeatW: lowInputHeat(point, part.outputV * (1 - part.outputTolerancePct / 100), dropoutV, isShort),
      efficiency:
        isDrawing && point.outputV !== null && point.feedV !== null && point.feedV > 0
          ? (point.outputV * point.outputA!) / (point.feedV * inputA)
          : null,
      quiescentShare: isDrawing ? point.groundA! / inputA : null,
      state: isShort ? 'shorted' : stateOf(point),
    };
  });
}

function nominalInput(
  board: Board,
  condition: Condition,
  { feed, dropper }: Regulator,
  inputA: number | null,
  outputs: ReadonlyMap<string, number | null>,
): number | null {
  if (!feed || inputA === null) return null;
  let feedV: number | null | undefined;
  if ('regulator' in feed) feedV = outputs.get(feed.regulator);
  else {
    const supply = board.supplies.find(({ name }) => name === feed.supply);
    // A condition that holds its supply high leaves the nominal as it is; one that holds it lower takes it down.
    feedV = supply && Math.min(supply.nominalV, condition.supplies[supply.name] ?? supply.nominalV);
  }
  if (feedV === undefined || feedV === null) return null;
  return Math.max(0, feedV - (dropper?.dropV ?? 0) - (dropper?.resistanceOhm ?? 0) * inputA);
}

function lowInputHeat(
  { lowestInputV, outputA, groundA }: OperatingPoint,
  lowestOutputV: number,
  dropoutV: number,
  isShort: boolean,
): number | null {
  if (lowestInputV === null || outputA === null || groundA === null) return null;
  const outputV = isShort ? 0 : Math.min(lowestOutputV, Math.max(0, lowestInputV - dropoutV));
  return (lowestInputV - outputV) * outputA + lowestInputV * groundA;
}

function stateOf({ regulating, headroomV }: OperatingPoint): RailState {
  if (regulating === null) return 'not evaluated';
  if (!regulating) return 'out of regulation';
  if (headroomV === null) return 'not evaluated';
  return headroomV < 0 ? 'starves' : 'regulates';
}

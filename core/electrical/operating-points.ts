import type { Condition } from '#core/board/condition.ts';
import type { Board } from '#core/board/document.ts';
import type { Regulator } from '#core/board/placement.ts';
import { atCurrent } from './current-table.ts';
import { orderByFeed } from './feed-order.ts';
import type { OperatingPoint } from './operating-point.ts';
import { isShorted, outputCurrents } from './output-currents.ts';

/** Voltages that a regulator offers to those it feeds: at the heat corner and at the headroom corner. */
type Offer = { heatV: number | null; headroomV: number | null };

/**
 * Every regulator of a board in one condition.
 * Heat corner: highest input (the condition's supply voltage, or the supply's maximum) with the lowest output;
 * P = (Vin − Vout)·Iout + Vin·Iground. Headroom corner: lowest supply less droppers against the highest output and the
 * largest dropout at this load. In dropout the output follows the input. A shorted output takes the current limit at 0 V.
 */
export function operatingPoints(board: Board, condition: Condition): Map<string, OperatingPoint> {
  const currents = outputCurrents(board, condition);
  const points = new Map<string, OperatingPoint>();
  const offers = new Map<string, Offer>();
  for (const regulator of orderByFeed(board.regulators)) {
    const { point, offer } = operate(board, condition, regulator, currents.get(regulator.ref) ?? null, offers);
    points.set(regulator.ref, point);
    offers.set(regulator.ref, offer);
  }
  return points;
}

function operate(
  board: Board,
  condition: Condition,
  regulator: Regulator,
  currents: { outputA: number; groundA: number } | null,
  offers: ReadonlyMap<string, Offer>,
): { point: OperatingPoint; offer: Offer } {
  const part = board.parts[regulator.part]!;
  const feed = feedVoltages(board, condition, regulator, offers);
  const isShort = isShorted(condition, regulator);
  const needed = regulator.powerW === null || regulator.dropper !== null || isShort;
  const blank: OperatingPoint = {
    ref: regulator.ref,
    feedV: feed.heatV,
    inputV: null,
    lowestInputV: null,
    outputV: null,
    outputA: currents?.outputA ?? null,
    groundA: currents?.groundA ?? null,
    dissipationW: isShort ? null : regulator.powerW,
    regulating: null,
    headroomV: null,
    dropperW: regulator.dropper ? null : 0,
    missing: needed ? missingInputs(regulator, condition, currents, feed, isShort) : [],
  };
  const lowestV = part.outputV * (1 - part.outputTolerancePct / 100);
  const highestV = part.outputV * (1 + part.outputTolerancePct / 100);
  if (!currents || feed.heatV === null) {
    // A part of known heat with nothing said of its input is taken to regulate, so that what it feeds can be computed.
    const isKnown = regulator.powerW !== null && !regulator.feed && !isShort;
    return { point: blank, offer: { heatV: isKnown ? highestV : null, headroomV: isKnown ? lowestV : null } };
  }
  const resistance = regulator.dropper?.resistanceOhm ?? 0;
  const drop = regulator.dropper?.dropV ?? 0;
  const wanted = currents.outputA + currents.groundA;
  const feedV = feed.heatV;
  // A resistor cannot carry more than brings the pin to 0 V; a dead feed carries nothing.
  const most = Math.max(0, feedV - drop) / Math.max(resistance, 1e-12);
  const share = wanted > 0 ? Math.min(1, most / wanted) : 1;
  const inputA = feedV > 0 ? wanted * share : 0;
  const outputA = feedV > 0 ? currents.outputA * share : 0;
  const groundA = inputA - outputA;
  const inputV = Math.max(0, feedV - drop - resistance * inputA);
  const dropoutV = atCurrent(part.dropoutV, outputA);
  const held = !isShort && inputV - dropoutV >= lowestV;
  const outputV = isShort ? 0 : held ? lowestV : Math.max(0, inputV - dropoutV);
  const computed = (inputV - outputV) * outputA + inputV * groundA;
  const lowInputV = feed.headroomV === null ? null : feed.headroomV - drop - resistance * wanted;
  return {
    point: {
      ...blank,
      inputV,
      lowestInputV: lowInputV === null ? null : Math.max(0, lowInputV),
      outputV,
      outputA,
      groundA,
      dissipationW: isShort ? computed : (regulator.powerW ?? computed),
      regulating: held,
      headroomV: isShort || lowInputV === null ? null : lowInputV - highestV - dropoutV,
      dropperW: Math.max(0, feedV - inputV) * inputA,
    },
    offer: {
      heatV: isShort ? 0 : Math.min(highestV, Math.max(0, inputV - dropoutV)),
      headroomV: isShort || lowInputV === null ? null : Math.min(lowestV, Math.max(0, lowInputV - dropoutV)),
    },
  };
}

function feedVoltages(
  board: Board,
  condition: Condition,
  { feed }: Regulator,
  offers: ReadonlyMap<string, Offer>,
): Offer {
  if (!feed) return { heatV: null, headroomV: null };
  if ('regulator' in feed) return offers.get(feed.regulator) ?? { heatV: null, headroomV: null };
  const supply = board.supplies.find((candidate) => candidate.name === feed.supply);
  if (!supply) return { heatV: null, headroomV: null };
  const stated = condition.supplies[supply.name];
  return { heatV: stated ?? supply.maxV, headroomV: Math.min(supply.minV, stated ?? supply.minV) };
}

function missingInputs(
  regulator: Regulator,
  condition: Condition,
  currents: unknown,
  feed: Offer,
  isShort: boolean,
): string[] {
  const missing: string[] = [];
  if (!regulator.feed) missing.push('its feed (a supply or another regulator)');
  else if (feed.heatV === null) missing.push('the voltage of its feed');
  if (!currents && isShort) missing.push('its current limit');
  else if (!currents && condition.loadsA[regulator.ref] === undefined) missing.push('its load current');
  else if (!currents) missing.push('the load current of a regulator that it feeds');
  return missing;
}

import type { CurrentLimit, LandNet, PassElement } from '#core/board/part.ts';
import { formatGiven } from '#core/format.ts';

export const passElementWords: Record<PassElement, string> = {
  'npn-darlington': 'NPN Darlington',
  'npn-pnp': 'NPN driven by PNP',
  pnp: 'PNP',
  pmos: 'P-channel MOSFET',
  nmos: 'N-channel MOSFET',
};

export const netWords: Record<LandNet, string> = {
  ground: 'the ground net',
  input: 'the input net',
  output: 'the output net',
  none: 'no net; copper of its own',
};

export function limitWords(limit: CurrentLimit): string {
  return limit.kind === 'constant'
    ? `${formatGiven(limit.limitA, 'A')}, constant`
    : `foldback from ${formatGiven(limit.kneeA, 'A')} to ${formatGiven(limit.shortA, 'A')} into a short`;
}

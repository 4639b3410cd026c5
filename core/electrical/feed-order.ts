import type { Regulator } from '#core/board/placement.ts';

type Fed = Pick<Regulator, 'ref' | 'feed'>;

const upstream = (regulator: Fed | undefined) =>
  regulator?.feed && 'regulator' in regulator.feed ? regulator.feed.regulator : null;

/** A circle of feeds as the references in it, each fed from the next; null when there is none. */
export function feedCycle(regulators: readonly Fed[]): string[] | null {
  const byRef = new Map(regulators.map((regulator) => [regulator.ref, regulator]));
  for (const regulator of regulators) {
    const path: string[] = [];
    for (let ref: string | null = regulator.ref; ref !== null; ref = upstream(byRef.get(ref))) {
      const met = path.indexOf(ref);
      if (met >= 0) return path.slice(met);
      path.push(ref);
    }
  }
  return null;
}

/** Regulators with every one after the regulator that feeds it. The feeds must run in no circle (`feedCycle`). */
export function orderByFeed<T extends Fed>(regulators: readonly T[]): T[] {
  const byRef = new Map(regulators.map((regulator) => [regulator.ref, regulator]));
  const depth = (regulator: T): number => {
    const above = byRef.get(upstream(regulator) ?? '');
    return above ? depth(above) + 1 : 0;
  };
  return [...regulators].sort((a, b) => depth(a) - depth(b));
}

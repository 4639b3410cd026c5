import type { SnapLine } from './snap-lines.ts';

/** A drawn guide: from one object to the other along the line they share, mm. */
export type GuideLine = { axis: 0 | 1; at: number; from: number; to: number };

/** Tolerance within which two lines are the same, mm: figures are kept to six places. */
const sameMm = 2e-6;

/** Lines that a moved object shares with others now, each once, spanning all that lie on it. */
export function guideLines(moving: readonly SnapLine[], lines: readonly SnapLine[]): GuideLine[] {
  const guides = new Map<string, GuideLine>();
  for (const own of moving) {
    for (const line of lines) {
      if (line.axis !== own.axis || Math.abs(line.at - own.at) > sameMm) continue;
      const name = `${own.axis}:${own.at.toFixed(5)}`;
      const before = guides.get(name);
      guides.set(name, {
        axis: own.axis,
        at: own.at,
        from: Math.min(own.low, line.low, before?.from ?? Infinity),
        to: Math.max(own.high, line.high, before?.to ?? -Infinity),
      });
    }
  }
  return [...guides.values()];
}

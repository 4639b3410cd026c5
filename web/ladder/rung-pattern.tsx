import type { LadderPart } from './ladder-steps.ts';

/** Lightness and hatch of each rung, so that they differ without colour. */
const looks: Record<LadderPart, { opacity: number; hatch: string | null }> = {
  box: { opacity: 0.12, hatch: null },
  air: { opacity: 0.2, hatch: 'M0 3H6' },
  neighbours: { opacity: 0.3, hatch: 'M0 6L6 0' },
  board: { opacity: 0.6, hatch: null },
  package: { opacity: 1, hatch: 'M0 0L6 6' },
};

/** Fill `url(#rung-…)` of one part of a rise. */
export function RungPattern({ part }: { part: LadderPart }) {
  const { opacity, hatch } = looks[part];
  return (
    <pattern id={`rung-${part}`} width="6" height="6" patternUnits="userSpaceOnUse">
      <rect width="6" height="6" fill="var(--panel)" />
      <rect width="6" height="6" fill="var(--copper)" opacity={opacity} />
      {hatch ? <path d={hatch} stroke={part === 'package' ? 'var(--panel)' : 'var(--ink)'} strokeWidth="0.9" /> : null}
    </pattern>
  );
}

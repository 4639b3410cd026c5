import type { PackageModel } from '#core/board/package.ts';

/** How a package hands its heat to the board: a tab beside its body, a pad under its body, or leads alone. */
export type HeatPath = 'tab' | 'pad' | 'leads';

/** A land that reaches out of the body by more than this is a tab, mm. */
const reachMm = 0.2;

/** Taken from the lands of a package model, never from a name. */
export function heatPathOf({ lands, bodyMm }: Pick<PackageModel, 'lands' | 'bodyMm'>): HeatPath {
  const tabs = lands.filter((land) => land.kind === 'tab');
  if (tabs.length === 0) return 'leads';
  const [length, width] = bodyMm;
  const outside = tabs.some((land) =>
    land.pads.some(
      ({ at: [x, y], sizeMm: [w, h] }) =>
        Math.abs(x) + w / 2 > length / 2 + reachMm || Math.abs(y) + h / 2 > width / 2 + reachMm,
    ),
  );
  return outside ? 'tab' : 'pad';
}

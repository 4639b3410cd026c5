import type { PackageModel } from '#core/board/package.ts';

const sizePx = 44;

/** Body and lands of a package from the top, all packages to one scale as far as they fit. */
export function PackageSketch({ model }: { model: PackageModel }) {
  const pads = model.lands.flatMap((land) => land.pads.map((pad) => ({ ...pad, kind: land.kind })));
  const reach = Math.max(
    5,
    ...pads.map((pad) => Math.max(Math.abs(pad.at[0]) + pad.sizeMm[0] / 2, Math.abs(pad.at[1]) + pad.sizeMm[1] / 2)),
    model.bodyMm[0] / 2,
    model.bodyMm[1] / 2,
  );
  return (
    <svg
      aria-hidden="true"
      width={sizePx}
      height={sizePx}
      viewBox={`${-reach} ${-reach} ${2 * reach} ${2 * reach}`}
      className="shrink-0"
    >
      {pads.map((pad) => (
        <rect
          key={`${pad.at[0]} ${pad.at[1]}`}
          x={pad.at[0] - pad.sizeMm[0] / 2}
          y={-pad.at[1] - pad.sizeMm[1] / 2}
          width={pad.sizeMm[0]}
          height={pad.sizeMm[1]}
          fill="var(--copper)"
          opacity={pad.kind === 'tab' ? 0.9 : 0.6}
        />
      ))}
      <rect
        x={-model.bodyMm[0] / 2}
        y={-model.bodyMm[1] / 2}
        width={model.bodyMm[0]}
        height={model.bodyMm[1]}
        fill="none"
        stroke="var(--ink)"
        strokeWidth={reach / 18}
      />
    </svg>
  );
}

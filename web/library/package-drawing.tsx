import type { PackageModel } from '#core/board/package.ts';

/** Lands and body seen from the top, to scale, with a scale bar of 5 mm (1 mm for small ones). */
export function PackageDrawing({ model }: { model: PackageModel }) {
  const [length, width] = model.bodyMm;
  const pads = model.lands.flatMap(({ kind, pads: list }) => list.map((pad) => ({ ...pad, kind })));
  const reach = (axis: 0 | 1, body: number) =>
    Math.max(body / 2, ...pads.map(({ at, sizeMm }) => Math.abs(at[axis]) + sizeMm[axis] / 2));
  const halfX = reach(0, length);
  const halfY = reach(1, width);
  const margin = Math.max(halfX, halfY) * 0.12;
  const bar = Math.max(halfX, halfY) > 4 ? 5 : 1;
  const thin = Math.max(halfX, halfY) / 110;
  const barY = halfY + margin * 1.6;
  return (
    <svg
      role="img"
      aria-label={`${model.name} from the top: body and lands to scale`}
      viewBox={`${-halfX - margin} ${-halfY - margin} ${2 * (halfX + margin)} ${2 * (halfY + margin) + margin * 2.4}`}
      className="mt-4 h-64 w-full"
    >
      {pads.map(({ at, sizeMm, kind }) => (
        <rect
          key={`${at[0]},${at[1]}`}
          x={at[0] - sizeMm[0] / 2}
          // y points up on the board and down in the drawing.
          y={-at[1] - sizeMm[1] / 2}
          width={sizeMm[0]}
          height={sizeMm[1]}
          fill="var(--copper)"
          fillOpacity={kind === 'tab' ? 0.55 : 0.85}
        />
      ))}
      <rect
        x={-length / 2}
        y={-width / 2}
        width={length}
        height={width}
        fill="var(--ink)"
        fillOpacity="0.08"
        stroke="var(--ink)"
        strokeWidth={thin * 1.5}
      />
      <path d={`M${-bar / 2} ${barY}h${bar}`} stroke="var(--ink)" strokeWidth={thin * 1.5} />
      <path
        d={`M${-bar / 2} ${barY - margin * 0.3}v${margin * 0.6}M${bar / 2} ${barY - margin * 0.3}v${margin * 0.6}`}
        stroke="var(--ink)"
        strokeWidth={thin * 1.5}
      />
      <text
        x={bar / 2 + margin * 0.5}
        y={barY}
        dominantBaseline="middle"
        fontSize={Math.max(halfX, halfY) * 0.13}
        fill="var(--ink)"
      >
        {bar} mm
      </text>
    </svg>
  );
}

import { formatQuantity } from '#core/format.ts';
import { type HeatScale, bandColour } from '#core/drawing/heat-scale.ts';

export type HeatLimit = { label: string; valueC: number };

type Props = {
  scale: HeatScale;
  /** What the colours show, e.g. "Board, layer L1". */
  title: string;
  /** Coolest and hottest temperature in the picture; null while there is no picture. */
  range: { minC: number; maxC: number } | null;
  limits?: readonly HeatLimit[];
};

const barHeight = 14;

/** Scale bar: colour bands with their borders in °C, the limits as marks, and the coolest and hottest value in words. */
export function HeatLegend({ scale, title, range, limits = [] }: Props) {
  const share = (valueC: number) => ((valueC - scale.minC) / (scale.maxC - scale.minC)) * 100;
  const borders = [...scale.levels, scale.maxC];
  const every = borders.length > 8 ? 2 : 1;
  return (
    <figure className="text-xs text-ink">
      <figcaption className="flex flex-wrap justify-between gap-x-4">
        <span className="font-semibold">{title}, °C</span>
        <span className="text-ink-soft">
          {range
            ? `coolest ${formatQuantity(range.minC, '°C')} · hottest ${formatQuantity(range.maxC, '°C')}`
            : 'no temperatures yet'}
        </span>
      </figcaption>
      <div className="relative mt-1 mb-4">
        <svg width="100%" height={barHeight} aria-hidden="true" className="block border border-line-strong">
          {scale.levels.map((level, index) => (
            <rect
              key={level}
              x={`${share(level)}%`}
              width={`${100 / scale.levels.length + 0.1}%`}
              height={barHeight}
              fill={bandColour(scale, index)}
            />
          ))}
          {limits.map((limit) => (
            <g key={limit.label}>
              <line
                x1={`${share(limit.valueC)}%`}
                x2={`${share(limit.valueC)}%`}
                y2={barHeight}
                stroke="#fff"
                strokeWidth="4"
              />
              <line
                x1={`${share(limit.valueC)}%`}
                x2={`${share(limit.valueC)}%`}
                y2={barHeight}
                stroke="#000"
                strokeWidth="2"
                strokeDasharray="4 2"
              />
            </g>
          ))}
        </svg>
        {borders.map((border, index) =>
          index % every === 0 ? (
            <span
              key={border}
              className="absolute top-full leading-4"
              style={{ left: `${share(border)}%`, transform: edgeShift(index, borders.length) }}
            >
              {border}
            </span>
          ) : null,
        )}
      </div>
      {limits.length > 0 ? (
        <p className="text-ink-soft">
          {limits.map((limit) => `${limit.label} ${formatQuantity(limit.valueC, '°C')}`).join(' · ')}: dashed line
        </p>
      ) : null}
    </figure>
  );
}

/** Keeps the first and the last figure inside the bar's width. */
function edgeShift(index: number, count: number): string {
  return `translateX(${index === 0 ? 0 : index >= count - 1 ? -100 : -50}%)`;
}

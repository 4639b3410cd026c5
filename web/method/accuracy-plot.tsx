import { scaleLog } from 'd3-scale';
import { stillShares } from '#core/accuracy/model-error.ts';
import type { PublishedCase } from '#core/accuracy/published-case.ts';

const size = 420;
const edge = { left: 52, bottom: 44, top: 10, right: 10 };
const domain = [8, 250] as const;
const ticks = [10, 20, 50, 100, 200];

/** Predicted against published rise per watt, with the lines of one and two standard deviations; the table beside it says the same. */
export function AccuracyPlot({ cases }: { cases: readonly PublishedCase[] }) {
  const x = scaleLog(domain, [edge.left, size - edge.right]);
  const y = scaleLog(domain, [size - edge.bottom, edge.top]);
  const line = (factor: number) => {
    const [low, high] = [domain[0] * Math.max(1, 1 / factor), domain[1] * Math.min(1, 1 / factor)];
    return { x1: x(low), y1: y(low * factor), x2: x(high), y2: y(high * factor) };
  };
  const lines = [
    { factor: 1, dash: undefined, label: '' },
    ...[1, 2].flatMap((sigmas) => {
      const dash = sigmas === 1 ? '6 4' : '2 4';
      const share = 1 + sigmas * stillShares.all;
      return [
        { factor: share, dash, label: `${sigmas}σ` },
        { factor: 1 / share, dash, label: '' },
      ];
    }),
  ];
  return (
    <figure className="max-w-[30rem]">
      <svg
        viewBox={`0 0 ${size} ${size}`}
        role="img"
        aria-label="Predicted against published junction-to-ambient resistance; every point is a row of the table"
      >
        {ticks.map((tick) => (
          <g key={tick} className="fill-ink-soft text-[13px]">
            <line x1={x(tick)} x2={x(tick)} y1={edge.top} y2={size - edge.bottom} className="stroke-line" />
            <line y1={y(tick)} y2={y(tick)} x1={edge.left} x2={size - edge.right} className="stroke-line" />
            <text x={x(tick)} y={size - edge.bottom + 18} textAnchor="middle">
              {tick}
            </text>
            <text x={edge.left - 8} y={y(tick) + 4} textAnchor="end">
              {tick}
            </text>
          </g>
        ))}
        {lines.map(({ factor, dash }) => (
          <line key={factor} {...line(factor)} strokeDasharray={dash} className="stroke-line-strong" />
        ))}
        {lines
          .filter(({ label }) => label !== '')
          .map(({ factor, label }) => (
            <text key={label} x={x(120)} y={y(120 * factor) - 5} textAnchor="end" className="fill-ink-soft text-[13px]">
              {label}
            </text>
          ))}
        {cases.map((one) => (
          <circle
            key={one.id}
            cx={x(one.publishedKPerW)}
            cy={y(one.predictedKPerW)}
            r={3.5}
            className={one.contradiction === null ? 'fill-copper' : 'fill-none stroke-ink-soft'}
          >
            <title>{`${one.id}: published ${one.publishedKPerW}, predicted ${one.predictedKPerW.toFixed(1)} K/W`}</title>
          </circle>
        ))}
        <text x={(size + edge.left) / 2} y={size - 6} textAnchor="middle" className="fill-ink text-[14px]">
          Published, K/W
        </text>
        <text transform={`translate(14 ${size / 2}) rotate(-90)`} textAnchor="middle" className="fill-ink text-[14px]">
          Predicted, K/W
        </text>
      </svg>
      <figcaption className="text-sm text-ink-soft">
        Filled: counted. Open: the source contradicts itself. Dashed and dotted: one and two standard deviations of all
        boards in still air.
      </figcaption>
    </figure>
  );
}

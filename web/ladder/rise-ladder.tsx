import { Link } from 'react-router-dom';
import { paths } from '#web/paths.ts';
import { uncertaintyWords } from '#core/result/uncertainty-words.ts';
import type { RegulatorResult } from '#core/result/result.ts';
import { formatChange, formatQuantity } from '#core/format.ts';
import { labelHeights } from './label-heights.ts';
import { ladderSteps, rungs } from './ladder-steps.ts';
import { RungPattern } from './rung-pattern.tsx';

type Props = { regulator: RegulatorResult; ambientC: number; limitC: number | null };

const height = 300;
const top = 26;
const foot = 24;
const column = { x: 56, width: 64 };
const labelX = 164;
const lineHeight = 18;

/** One junction from the outside ambient up: each part of its rise as a rung, the uncertainty at the top, the limit across. */
export function RiseLadder({ regulator, ambientC, limitC }: Props) {
  const { junctionC, uncertaintyK, ref } = regulator;
  const { steps } = ladderSteps(regulator);
  if (junctionC === null || steps.length === 0) {
    return <p className="text-sm text-ink-soft">{ref} was not evaluated in this condition, so there is no ladder.</p>;
  }
  const reachK = Math.max(10, junctionC + (uncertaintyK ?? 0) - ambientC, (limitC ?? ambientC) - ambientC);
  const y = (riseK: number) => height - foot - (Math.max(0, riseK) / reachK) * (height - foot - top);
  const shown = steps.filter(({ fromK, toK }) => Math.abs(toK - fromK) >= 0.05);
  const wanted = shown.map(({ fromK, toK }) => y((fromK + toK) / 2));
  const places = labelHeights(wanted, lineHeight, top, height - foot);
  const junctionK = junctionC - ambientC;
  const band = uncertaintyK ?? 0;
  return (
    <figure>
      <svg
        role="img"
        aria-label={`Rise ladder of ${ref}; the list below says the same`}
        viewBox={`0 0 380 ${height}`}
        className="w-full max-w-[26rem]"
        fontSize="13"
        fill="var(--ink)"
      >
        <defs>
          {rungs.map(({ part }) => (
            <RungPattern key={part} part={part} />
          ))}
        </defs>
        {shown.map(({ part, fromK, toK }, index) => (
          <g key={part}>
            <rect
              x={column.x}
              y={y(toK)}
              width={column.width}
              height={Math.max(0.6, y(fromK) - y(toK))}
              fill={`url(#rung-${part})`}
              stroke="var(--ink)"
              strokeWidth="0.8"
            />
            <path
              d={`M${column.x + column.width} ${wanted[index]} H${column.x + column.width + 14} L${labelX - 6} ${places[index]}`}
              fill="none"
              stroke="var(--line-strong)"
            />
            <text x={labelX} y={places[index]} dominantBaseline="central">
              {rungs.find((rung) => rung.part === part)?.word} {formatChange(toK - fromK, 'K')}
            </text>
          </g>
        ))}
        <g stroke="var(--ink)" strokeWidth="1.4">
          <path d={`M${column.x + column.width / 2} ${y(junctionK + band)} V${y(junctionK - band)}`} />
          <path
            d={`M${column.x + column.width / 2 - 7} ${y(junctionK + band)} h14 m-14 ${y(junctionK - band) - y(junctionK + band)} h14`}
          />
        </g>
        <text x={column.x - 6} y={y(junctionK)} textAnchor="end" dominantBaseline="central" fontWeight="600">
          {formatQuantity(junctionC, '°C')}
        </text>
        <path d={`M${column.x - 14} ${y(0)} H${column.x + column.width + 14}`} stroke="var(--ink)" strokeWidth="1.2" />
        <text x={column.x + column.width / 2} y={height - 6} textAnchor="middle">
          outside {formatQuantity(ambientC, '°C')}
        </text>
        {limitC === null ? null : (
          <g>
            <path
              d={`M${column.x - 14} ${y(limitC - ambientC)} H372`}
              stroke="var(--over)"
              strokeWidth="1.6"
              strokeDasharray="6 3"
            />
            <text x="372" y={y(limitC - ambientC) - 8} textAnchor="end" fill="var(--over)" fontWeight="600">
              limit {formatQuantity(limitC, '°C')}
            </text>
          </g>
        )}
      </svg>
      <figcaption className="mt-2 text-sm">
        <ol className="sr-only">
          <li>Outside ambient {formatQuantity(ambientC, '°C')}</li>
          {steps.map(({ part, fromK, toK }) => (
            <li key={part}>
              {rungs.find((rung) => rung.part === part)?.word} {formatChange(toK - fromK, 'K')}
            </li>
          ))}
        </ol>
        Junction {formatQuantity(junctionC, '°C')} ± {formatQuantity(uncertaintyK, 'K')} (
        <Link to={paths.method()} className="underline underline-offset-4 hover:text-copper">
          {uncertaintyWords(regulator)}
        </Link>
        ){limitC === null ? '' : `, limit ${formatQuantity(limitC, '°C')}`}
      </figcaption>
    </figure>
  );
}

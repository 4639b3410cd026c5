import type { ConditionResult, RegulatorResult } from '#core/result/result.ts';
import { formatChange, formatQuantity } from '#core/format.ts';
import { classes } from '#web/ui/classes.ts';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';
import { ladderReach, ladderSteps, rungs } from './ladder-steps.ts';
import { RungPattern } from './rung-pattern.tsx';

type Props = {
  /** One condition; null while nothing is calculated. */
  results: ConditionResult | null;
  /** Reference of the regulator that is selected elsewhere. */
  selected: string | null;
  onSelect: (ref: string) => void;
};

const height = 72;
const width = 26;

/** Rise ladders of all regulators of one condition side by side, on one scale: kelvins over the ambient, up to the limit. */
export function LadderStrip({ results, selected, onSelect }: Props) {
  const regulators = results?.regulators ?? [];
  if (regulators.length === 0) return null;
  const reachK = ladderReach(regulators);
  return (
    <section aria-label="Rise ladders" className="flex items-stretch overflow-x-auto border-t border-line bg-panel">
      <svg width="0" height="0" aria-hidden="true" className="absolute">
        <defs>
          {rungs.map(({ part }) => (
            <RungPattern key={part} part={part} />
          ))}
        </defs>
      </svg>
      <dl className="shrink-0 border-r border-line px-4 py-1.5 text-xs leading-4">
        {rungs.toReversed().map(({ part, word }) => (
          <div key={part} className="flex items-center gap-2">
            <dt aria-hidden="true">
              <svg width="12" height="10">
                <rect width="12" height="10" fill={`url(#rung-${part})`} stroke="var(--ink)" strokeWidth="0.6" />
              </svg>
            </dt>
            <dd>{word}</dd>
          </div>
        ))}
      </dl>
      <ul className="flex">
        {regulators.map((regulator) => (
          <li key={regulator.ref} className="flex border-r border-line">
            <button
              type="button"
              aria-pressed={regulator.ref === selected}
              onClick={() => onSelect(regulator.ref)}
              title={spoken(regulator)}
              className={classes(
                'flex items-center gap-3 px-3 py-1.5 text-left outline-offset-[-3px] hover:bg-copper-soft',
                regulator.ref === selected && 'bg-copper-soft',
              )}
            >
              <LadderPicture regulator={regulator} reachK={reachK} />
              <span className="text-xs leading-4 whitespace-nowrap">
                <span className="block text-sm font-semibold">{regulator.ref}</span>
                <span className="block text-sm">{formatQuantity(regulator.junctionC, '°C')}</span>
                <VerdictMark verdict={regulator.verdict} size={12} />
                <span className="block text-ink-soft">{marginText(regulator)}</span>
              </span>
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}

/** One ladder: rungs from the ambient up, the derated limit as a dashed line. */
function LadderPicture({ regulator, reachK }: { regulator: RegulatorResult; reachK: number }) {
  const y = (riseK: number) => height - 1 - (riseK / reachK) * (height - 4);
  const { steps, limitK } = ladderSteps(regulator);
  return (
    <svg width={width} height={height} aria-hidden="true" className="shrink-0 overflow-visible">
      {steps.map(({ part, fromK, toK }) => (
        <rect
          key={part}
          x="3"
          width={width - 6}
          y={y(Math.max(fromK, toK))}
          height={Math.abs(y(fromK) - y(toK))}
          fill={`url(#rung-${part})`}
          stroke="var(--ink)"
          strokeWidth="0.7"
        />
      ))}
      <line x2={width} y1={y(0)} y2={y(0)} stroke="var(--ink)" strokeWidth="1.2" />
      {limitK === null ? null : (
        <line x2={width} y1={y(limitK)} y2={y(limitK)} stroke="var(--ink)" strokeWidth="1.6" strokeDasharray="4 2" />
      )}
    </svg>
  );
}

function marginText(regulator: RegulatorResult): string {
  const limit = regulator.limits.find(({ quantity }) => quantity === 'junctionC');
  return limit ? `margin ${formatChange(limit.margin, 'K')}` : 'no limit';
}

/** The ladder in words. */
function spoken({ ref, ladderK }: RegulatorResult): string {
  if (!ladderK) return `${ref}: not evaluated`;
  return `${ref}: ${rungs.map(({ part, word }) => `${word} ${formatQuantity(ladderK[part], 'K')}`).join(', ')}`;
}

import { Link } from 'react-router-dom';
import { paths } from '#web/paths.ts';
import { uncertaintyWords } from '#core/result/uncertainty-words.ts';
import { formatChange, formatQuantity } from '#core/format.ts';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';
import { activeCheck } from '../canvas/use-heat-picture.ts';
import { useEditor } from '../editor-context.ts';
import { shownBoard } from '../editor-store.ts';
import { isCurrent } from '../solve/checks.ts';

/** Junction temperature, limit and margin of one regulator in the active condition. */
export function RegulatorResultLines({ regulatorRef }: { regulatorRef: string }) {
  const check = useEditor(activeCheck);
  const board = useEditor(shownBoard);
  const result = check?.condition.regulators.find((regulator) => regulator.ref === regulatorRef);
  if (!check || !result) return null;
  const limit = result.limits.find((candidate) => candidate.quantity === 'junctionC');
  return (
    <section aria-label={`Result of ${regulatorRef}`} className="border-b border-line px-4 py-3">
      <p className="flex flex-wrap items-baseline gap-x-3">
        <span className="text-xl font-semibold">{formatQuantity(result.junctionC, '°C')}</span>
        {result.uncertaintyK === null ? null : (
          <span className="text-sm text-ink-soft">
            ± {formatQuantity(result.uncertaintyK, 'K')},{' '}
            <Link to={paths.method()} className="underline underline-offset-4 hover:text-copper">
              {uncertaintyWords(result)}
            </Link>
          </span>
        )}
        <VerdictMark verdict={result.verdict} />
        {isCurrent(check, board) ? null : <span className="text-sm text-ink-soft">preview</span>}
      </p>
      <p className="text-sm">
        {limit
          ? `Derated limit ${formatQuantity(limit.limit, '°C')}, margin ${formatChange(limit.margin, 'K')}`
          : 'No junction rule in the criteria'}
      </p>
      <p className="text-sm text-ink-soft">
        {formatQuantity(result.dissipationW, 'W')} · case top {formatQuantity(result.caseTopC, '°C')} · hottest land{' '}
        {formatQuantity(result.landC, '°C')}
      </p>
      {result.regulating === false ? (
        <p className="text-sm font-semibold text-over">
          Does not regulate: headroom {formatQuantity(result.headroomV, 'V')}
        </p>
      ) : null}
    </section>
  );
}

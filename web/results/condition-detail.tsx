import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { Board } from '#core/board/document.ts';
import { formatNumber, formatQuantity } from '#core/format.ts';
import type { ConditionResult } from '#core/result/result.ts';
import { BoardPicture } from '#web/heat/board-picture.tsx';
import { decodeHeatField } from '#web/heat/decode-heat-field.ts';
import { heatFieldQuery } from '#web/revision/revision-queries.ts';
import { Loading } from '#web/ui/loading.tsx';
import { ProblemNotice } from '#web/ui/problem-notice.tsx';
import { SelectField } from '#web/ui/select-field.tsx';
import { Ledger } from './ledger.tsx';

type Props = {
  revisionId: string;
  solvedAt: string;
  condition: ConditionResult;
  conditions: readonly ConditionResult[];
  board: Board;
  upToDate: boolean;
  onChoose: (name: string) => void;
};

/** The whole board in one condition: heat picture, heat ledger, and how well the equations were solved. */
export function ConditionDetail({ revisionId, solvedAt, condition, conditions, board, upToDate, onChoose }: Props) {
  const { solver, energy } = condition;
  return (
    <section aria-label={`Board in ${condition.name}`} className="border-t border-line-strong pt-4">
      <div className="mb-4 flex flex-wrap items-end justify-between gap-4">
        <h2 className="text-lg font-semibold">Board and heat</h2>
        <div className="w-72">
          <SelectField
            label="Condition"
            value={condition.name}
            options={conditions.map(({ name }) => ({ value: name, label: name }))}
            onChange={onChoose}
          />
        </div>
      </div>
      {condition.status === 'converged' ? (
        <div className="flex flex-col gap-8">
          {upToDate ? (
            <HeatPicture revisionId={revisionId} solvedAt={solvedAt} condition={condition} board={board} />
          ) : (
            <p className="text-ink-soft">
              The picture belongs to an earlier sketch and is not drawn on this one. Run the check again.
            </p>
          )}
          <Ledger condition={condition} />
        </div>
      ) : (
        <p className="border-l-4 border-over pl-3">
          No converged solution: {condition.message ?? condition.status}. Nothing of it may be used.
        </p>
      )}
      {solver && energy ? (
        <p className="mt-4 text-sm text-ink-soft">
          {solver.cells} unknowns of {formatQuantity(solver.cellMm, 'mm')}, {solver.iterations} iterations, residual{' '}
          {solver.residual.toExponential(1)}; heat in {formatNumber(energy.inW, 3)} W, out{' '}
          {formatNumber(energy.outW, 3)} W; grid error at most {formatQuantity(solver.gridErrorK, 'K')}.
        </p>
      ) : null}
    </section>
  );
}

type PictureProps = Pick<Props, 'revisionId' | 'solvedAt' | 'condition' | 'board'>;

function HeatPicture({ revisionId, solvedAt, condition, board }: PictureProps) {
  const field = useQuery({ ...heatFieldQuery(revisionId, condition.name, solvedAt), select: decodeHeatField });
  const [wanted, setWanted] = useState('');
  if (field.error) return <ProblemNotice error={field.error} retry={() => void field.refetch()} />;
  if (!field.data) return <Loading what="the heat picture" />;
  const layers = field.data.layers.map(({ name }) => name);
  const layer = layers.includes(wanted) ? wanted : (layers[0] ?? '');
  const settings = board.conditions.find(({ name }) => name === condition.name);
  return (
    <div className="min-w-0">
      {layers.length > 1 ? (
        <div className="mb-3 w-40">
          <SelectField
            label="Layer"
            value={layer}
            options={layers.map((name) => ({ value: name, label: name }))}
            onChange={setWanted}
          />
        </div>
      ) : null}
      <BoardPicture
        board={board}
        condition={condition}
        field={field.data}
        layer={layer}
        airC={(settings?.ambientC ?? 25) + (settings?.boxRiseK ?? 0)}
      />
    </div>
  );
}

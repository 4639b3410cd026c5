import { VerdictMark } from '#web/ui/verdict-mark.tsx';
import { activeCheck } from '../canvas/use-heat-picture.ts';
import { AirForm } from '../condition/air-form.tsx';
import { useEditor, useEditorStore } from '../editor-context.ts';
import { shownBoard, isDirty } from '../editor-store.ts';
import { isCurrent } from '../solve/checks.ts';
import { BarSelect } from './bar-field.tsx';
import { RunCheck } from '#web/revision/run-check.tsx';

type Props = { revisionId: string; maySolve: boolean; flush: () => Promise<void> };

/** Which condition is shown, what came out of it here, its air, and the check that counts. */
export function ConditionBar({ revisionId, maySolve, flush }: Props) {
  const store = useEditorStore();
  const conditions = useEditor((state) => state.board.conditions);
  const active = useEditor((state) => state.activeCondition);
  const dirty = useEditor(isDirty);
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-1 border-b border-line px-2 py-1.5 sm:px-4">
      {active === null ? (
        <p className="text-sm text-ink-soft">No condition yet: add one on the page Conditions.</p>
      ) : (
        <>
          <BarSelect
            label="Condition"
            value={active}
            onChange={(activeCondition) => store.setState({ activeCondition })}
            options={conditions.map(({ name }) => ({ value: name, label: name }))}
          />
          <AirForm />
          <LocalVerdict />
        </>
      )}
      <div className="ml-auto">
        <RunCheck revisionId={revisionId} maySolve={maySolve} dirty={dirty} flush={flush} />
      </div>
    </div>
  );
}

/** What this page has calculated itself, and how far that goes. */
function LocalVerdict() {
  const check = useEditor(activeCheck);
  const board = useEditor(shownBoard);
  const busy = useEditor((state) => state.checks.busy);
  const fault = useEditor((state) => state.checks.fault);
  if (fault) return <p className="text-sm text-over">Not calculated: {fault}</p>;
  if (!check) return <p className="text-sm text-ink-soft">{busy ? 'Calculating…' : 'Nothing calculated yet'}</p>;
  if (check.condition.status !== 'converged') {
    return <p className="text-sm text-over">{check.condition.message ?? 'No converged solution'}</p>;
  }
  return (
    <p className="inline-flex items-center gap-2 text-sm">
      <VerdictMark verdict={check.condition.verdict} />
      <span className="text-ink-soft">{isCurrent(check, board) ? 'calculated on this page' : 'preview'}</span>
    </p>
  );
}

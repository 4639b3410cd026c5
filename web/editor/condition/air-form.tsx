import { Popover } from 'radix-ui';
import { Link } from 'react-router-dom';
import { changeCondition } from '#core/board/edits/change-condition.ts';
import type { Condition } from '#core/board/condition.ts';
import { formatQuantity } from '#core/format.ts';
import { useEditor } from '../editor-context.ts';
import { Group } from '../panels/group.tsx';
import { useEdit } from '../panels/use-edit.ts';
import { SurroundingsFields } from './surroundings-fields.tsx';

/** The air of the active condition in a line; pressed, in a small form. Loads and rails are on their own page. */
export function AirForm() {
  const condition = useEditor((state) =>
    state.board.conditions.find((candidate) => candidate.name === state.activeCondition),
  );
  if (!condition) return null;
  return (
    <Popover.Root>
      <Popover.Trigger className="inline-flex min-h-8 items-center rounded-sm border border-line-strong bg-panel px-2 text-sm hover:border-ink">
        {airText(condition)}
      </Popover.Trigger>
      <Popover.Portal>
        <Popover.Content
          align="start"
          sideOffset={4}
          collisionPadding={8}
          role="dialog"
          aria-label={`Air of ${condition.name}`}
          className="z-30 max-h-[var(--radix-popover-content-available-height)] w-[22rem] overflow-y-auto rounded-md border border-line-strong bg-panel"
        >
          <AirFields condition={condition} />
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  );
}

function airText({ ambientC, boxRiseK, air, orientation, altitudeM }: Condition): string {
  return [
    formatQuantity(ambientC, '°C', 0) + (boxRiseK > 0 ? ` + ${formatQuantity(boxRiseK, 'K', 0)} box` : ''),
    air.kind === 'still' ? 'still air' : `air at ${formatQuantity(air.speedMPerS, 'm/s')}`,
    orientation,
    ...(altitudeM !== 0 ? [formatQuantity(altitudeM, 'm')] : []),
  ].join(' · ');
}

function AirFields({ condition }: { condition: Condition }) {
  const { edit, disabled } = useEdit();
  const change = (what: string, patch: Partial<Condition>) =>
    edit(`Change ${what} of ${condition.name}`, (board) => changeCondition(board, condition.name, patch));
  return (
    <Group title={condition.name} note="Loads, supplies and faults stand on the page Conditions.">
      <SurroundingsFields condition={condition} disabled={disabled} change={change} />
      <Link to="../conditions" relative="path" className="self-end text-sm underline underline-offset-4">
        All of it
      </Link>
    </Group>
  );
}

import { Popover } from 'radix-ui';
import { Link } from 'react-router-dom';
import { changeCondition } from '#core/board/edits/change-condition.ts';
import type { Condition } from '#core/board/condition.ts';
import { formatQuantity } from '#core/format.ts';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { SelectField } from '#web/ui/select-field.tsx';
import { useEditor } from '../editor-context.ts';
import { Group } from '../panels/group.tsx';
import { useEdit } from '../panels/use-edit.ts';

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
  const { air } = condition;
  const change = (what: string, patch: Partial<Condition>) =>
    edit(`Change ${what} of ${condition.name}`, (board) => changeCondition(board, condition.name, patch));
  return (
    <Group title={condition.name} note="Loads, supplies and faults stand on the page Conditions.">
      <QuantityField
        label="Outside ambient"
        unit="°C"
        value={condition.ambientC}
        minimum={-100}
        maximum={250}
        disabled={disabled}
        onCommit={(ambientC) => ambientC !== null && change('the ambient', { ambientC })}
      />
      <QuantityField
        label="Rise in the box"
        unit="K"
        value={condition.boxRiseK}
        minimum={0}
        maximum={200}
        disabled={disabled}
        onCommit={(boxRiseK) => boxRiseK !== null && change('the box rise', { boxRiseK })}
      />
      <SelectField<Condition['air']['kind']>
        label="Air"
        value={air.kind}
        disabled={disabled}
        options={[
          { value: 'still', label: 'still' },
          { value: 'moving', label: 'moving' },
        ]}
        onChange={(kind) =>
          change('the air', { air: kind === 'still' ? { kind } : { kind, speedMPerS: 1, towardDeg: 0 } })
        }
      />
      <SelectField<Condition['orientation']>
        label="Board stands"
        value={condition.orientation}
        disabled={disabled}
        options={[
          { value: 'horizontal', label: 'horizontal' },
          { value: 'vertical', label: 'vertical' },
        ]}
        onChange={(orientation) => change('the orientation', { orientation })}
      />
      {air.kind === 'moving' ? (
        <>
          <QuantityField
            label="Speed"
            unit="m/s"
            value={air.speedMPerS}
            minimum={0.05}
            maximum={30}
            disabled={disabled}
            onCommit={(speedMPerS) => speedMPerS !== null && change('the air', { air: { ...air, speedMPerS } })}
          />
          <QuantityField
            label="Goes toward"
            unit="°"
            value={air.towardDeg}
            minimum={-360}
            maximum={360}
            disabled={disabled}
            onCommit={(towardDeg) => towardDeg !== null && change('the air', { air: { ...air, towardDeg } })}
          />
        </>
      ) : null}
      <QuantityField
        label="Altitude"
        unit="m"
        value={condition.altitudeM}
        minimum={-500}
        maximum={20000}
        disabled={disabled}
        onCommit={(altitudeM) => altitudeM !== null && change('the altitude', { altitudeM })}
      />
      <Link to="../conditions" relative="path" className="self-end text-sm underline underline-offset-4">
        All of it
      </Link>
    </Group>
  );
}

import type { Condition } from '#core/board/condition.ts';
import { changeCondition } from '#core/board/edits/change-condition.ts';
import { useEditor } from '#web/editor/editor-context.ts';
import { SurroundingsFields } from '#web/editor/condition/surroundings-fields.tsx';
import { NameField } from '#web/editor/panels/name-field.tsx';
import { useEdit } from '#web/editor/panels/use-edit.ts';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { SelectField } from '#web/ui/select-field.tsx';
import { AmountFields } from './amount-fields.tsx';

type Props = { condition: Condition; names: readonly string[]; onRenamed: (name: string) => void };

/** One condition in full: air, supplies, loads, powers and fault. */
export function ConditionFields({ condition, names, onRenamed }: Props) {
  const { edit, disabled } = useEdit();
  const board = useEditor((state) => state.board);
  const { fault, filmWPerM2K } = condition;
  const change = (what: string, patch: Partial<Condition>) =>
    edit(`Change ${what} of ${condition.name}`, (before) => changeCondition(before, condition.name, patch));
  const faultValue = fault === null ? '' : fault.kind === 'fan-stopped' ? 'fan-stopped' : `short ${fault.ref}`;
  return (
    <div className="grid gap-x-4 gap-y-3 sm:grid-cols-2 xl:grid-cols-3">
      <NameField
        label="Name"
        value={condition.name}
        maxLength={200}
        disabled={disabled}
        refuse={(name) => (names.includes(name) ? `There is a condition ${name} already.` : null)}
        onCommit={(name) => {
          change('the name', { name });
          onRenamed(name);
        }}
      />
      <SurroundingsFields condition={condition} disabled={disabled} change={change} />
      <QuantityField
        label="Fixed film, both faces"
        hint="Replaces convection and radiation where set"
        unit="W/(m²·K)"
        value={typeof filmWPerM2K === 'number' ? filmWPerM2K : (filmWPerM2K?.top ?? null)}
        minimum={0.1}
        maximum={100000}
        optional
        disabled={disabled}
        onCommit={(film) => change('the film', { filmWPerM2K: film })}
      />
      <SelectField
        label="Fault"
        value={faultValue}
        disabled={disabled}
        options={[
          { value: '', label: 'none' },
          { value: 'fan-stopped', label: 'fan stopped' },
          ...board.regulators.map(({ ref }) => ({ value: `short ${ref}`, label: `output of ${ref} shorted` })),
        ]}
        onChange={(value) =>
          change('the fault', {
            fault:
              value === ''
                ? null
                : value === 'fan-stopped'
                  ? { kind: 'fan-stopped' }
                  : { kind: 'output-short', ref: value.slice(6) },
          })
        }
      />
      <AmountFields
        title="Supply voltages"
        note="Empty: the supply’s highest"
        unit="V"
        maximum={2000}
        names={board.supplies.map(({ name }) => name)}
        amounts={condition.supplies}
        disabled={disabled}
        onChange={(supplies) => change('the supplies', { supplies })}
      />
      <AmountFields
        title="Load currents"
        note="Empty: not evaluated, unless it only feeds others"
        unit="A"
        maximum={200}
        names={board.regulators.map(({ ref }) => ref)}
        amounts={condition.loadsA}
        disabled={disabled}
        onChange={(loadsA) => change('the loads', { loadsA })}
      />
      <AmountFields
        title="Heat of other sources"
        note="Empty: the source’s own"
        unit="W"
        maximum={500}
        names={board.sources.map(({ ref }) => ref)}
        amounts={condition.powersW}
        disabled={disabled}
        onChange={(powersW) => change('the powers', { powersW })}
      />
    </div>
  );
}

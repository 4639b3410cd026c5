import type { Condition } from '#core/board/condition.ts';
import { changeCondition } from '#core/board/edits/change-condition.ts';
import { useEditor } from '#web/editor/editor-context.ts';
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
  const { air, fault, filmWPerM2K } = condition;
  const change = (what: string, patch: Partial<Condition>) =>
    edit(`Change ${what} of ${condition.name}`, (before) => changeCondition(before, condition.name, patch));
  const number = (
    what: string,
    label: string,
    key: 'ambientC' | 'boxRiseK' | 'altitudeM',
    unit: string,
    minimum: number,
    maximum: number,
  ) => (
    <QuantityField
      label={label}
      unit={unit}
      value={condition[key]}
      minimum={minimum}
      maximum={maximum}
      disabled={disabled}
      onCommit={(value) => value !== null && change(what, { [key]: value })}
    />
  );
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
      {number('the ambient', 'Outside ambient', 'ambientC', '°C', -100, 250)}
      {number('the box rise', 'Rise in the box', 'boxRiseK', 'K', 0, 200)}
      {number('the altitude', 'Altitude', 'altitudeM', 'm', -500, 20000)}
      <SelectField<Condition['orientation']>
        label="Board stands"
        value={condition.orientation}
        disabled={disabled}
        options={[
          { value: 'horizontal', label: 'horizontal, component side up' },
          { value: 'vertical', label: 'vertical' },
        ]}
        onChange={(orientation) => change('the attitude', { orientation })}
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
      {air.kind === 'moving' ? (
        <>
          <QuantityField
            label="Air speed"
            unit="m/s"
            value={air.speedMPerS}
            minimum={0.05}
            maximum={30}
            disabled={disabled}
            onCommit={(speedMPerS) => speedMPerS !== null && change('the air', { air: { ...air, speedMPerS } })}
          />
          <QuantityField
            label="Air goes toward"
            hint="Counter-clockwise from the right"
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

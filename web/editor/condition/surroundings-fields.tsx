import type { Condition } from '#core/board/condition.ts';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { SelectField } from '#web/ui/select-field.tsx';

type Props = {
  condition: Condition;
  disabled: boolean;
  /** @param what words for the step: "the ambient" */
  change: (what: string, patch: Partial<Condition>) => void;
};

/** What surrounds the board in a condition: ambient, box, air, attitude, altitude. */
export function SurroundingsFields({ condition, disabled, change }: Props) {
  const { air } = condition;
  return (
    <>
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
    </>
  );
}

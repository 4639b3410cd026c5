import type { Dropper } from '#core/board/placement.ts';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { SelectField } from '#web/ui/select-field.tsx';

type Props = {
  dropper: Dropper | null;
  /** Heat sources of the board that the dropper may be. */
  sources: readonly string[];
  onChange: (dropper: Dropper | null) => void;
  disabled: boolean;
};

/** Series resistor, diode, or both between the feed and the regulator, and the heat source that it is on the board. */
export function DropperFields({ dropper, sources, onChange, disabled }: Props) {
  const change = (patch: { resistanceOhm?: number | null; dropV?: number | null; source?: string | null }) => {
    const next = { ...dropper, ...patch };
    const resistance = next.resistanceOhm ?? null;
    const drop = next.dropV ?? null;
    if (resistance === null && drop === null) return onChange(null);
    onChange({
      ...(resistance !== null && { resistanceOhm: resistance }),
      ...(drop !== null && { dropV: drop }),
      ...(next.source && { source: next.source }),
    });
  };
  return (
    <>
      <QuantityField
        label="Dropper resistance"
        unit="Ω"
        value={dropper?.resistanceOhm ?? null}
        minimum={0}
        maximum={1e6}
        optional
        disabled={disabled}
        onCommit={(resistanceOhm) => change({ resistanceOhm })}
      />
      <QuantityField
        label="Dropper voltage"
        unit="V"
        value={dropper?.dropV ?? null}
        minimum={0}
        maximum={100}
        optional
        disabled={disabled}
        onCommit={(dropV) => change({ dropV })}
      />
      {dropper ? (
        <SelectField
          label="Dropper on the board"
          value={dropper.source ?? ''}
          disabled={disabled}
          options={[
            { value: '', label: 'not on the board' },
            ...sources.map((ref) => ({ value: ref, label: `Heat source ${ref}` })),
          ]}
          onChange={(source) => change({ source: source || null })}
        />
      ) : null}
    </>
  );
}

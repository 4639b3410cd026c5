import { QuantityField } from '#web/ui/quantity-field.tsx';

type Amounts = Readonly<Record<string, number>>;
type Props = {
  title: string;
  note: string;
  unit: string;
  maximum: number;
  names: readonly string[];
  amounts: Amounts;
  disabled: boolean;
  onChange: (amounts: Record<string, number>) => void;
};

/** One amount a name, each of which may be left out. */
export function AmountFields({ title, note, unit, maximum, names, amounts, disabled, onChange }: Props) {
  if (names.length === 0) return null;
  return (
    <fieldset className="border-t border-line pt-2 sm:col-span-2 xl:col-span-3">
      <legend className="float-left w-full text-sm">
        <span className="font-semibold">{title}</span> <span className="text-ink-soft">· {note}</span>
      </legend>
      <div className="clear-both grid grid-cols-2 gap-x-4 gap-y-2 pt-1 sm:grid-cols-3 lg:grid-cols-5">
        {names.map((name) => (
          <QuantityField
            key={name}
            label={name}
            unit={unit}
            value={amounts[name] ?? null}
            minimum={0}
            maximum={maximum}
            optional
            disabled={disabled}
            onCommit={(value) => onChange(withAmount(amounts, name, value))}
          />
        ))}
      </div>
    </fieldset>
  );
}

function withAmount(amounts: Amounts, name: string, value: number | null): Record<string, number> {
  const others = Object.entries(amounts).filter(([other]) => other !== name);
  return Object.fromEntries(value === null ? others : [...others, [name, value]]);
}

import type { Supply } from '#core/board/condition.ts';
import { addSupply } from '#core/board/edits/add-supply.ts';
import { changeSupply } from '#core/board/edits/change-supply.ts';
import { removeSupply } from '#core/board/edits/remove-supply.ts';
import { useEditor } from '#web/editor/editor-context.ts';
import { NameField } from '#web/editor/panels/name-field.tsx';
import { useEdit } from '#web/editor/panels/use-edit.ts';
import { Button } from '#web/ui/button.tsx';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { freeName } from './free-name.ts';
import { Section } from './section.tsx';

const voltages = [
  ['minV', 'Lowest'],
  ['nominalV', 'Nominal'],
  ['maxV', 'Highest'],
] as const;

/** Supplies with their three voltages; the lowest decides the headroom, the highest the heat. */
export function SuppliesSection() {
  const supplies = useEditor((state) => state.board.supplies);
  const { edit, disabled } = useEdit();
  const names = supplies.map(({ name }) => name);
  const add = () => {
    const name = freeName('VIN', names);
    edit(`Add supply ${name}`, (board) => addSupply(board, { name, minV: 5, nominalV: 5, maxV: 5 }));
  };
  return (
    <Section
      title="Supplies"
      note="The lowest voltage decides the headroom; a condition that names no voltage takes the highest for the heat."
      action={
        disabled ? null : (
          <Button size="small" onClick={add}>
            Add supply
          </Button>
        )
      }
    >
      {supplies.length === 0 ? <p className="text-sm text-ink-soft">No supply is stated yet.</p> : null}
      {supplies.map((supply) => (
        <div
          key={supply.name}
          className="grid grid-cols-2 gap-x-4 gap-y-2 border-b border-line py-3 sm:grid-cols-[2fr_1fr_1fr_1fr_auto] sm:items-end"
        >
          <NameField
            label="Name"
            value={supply.name}
            disabled={disabled}
            refuse={(name) => (names.includes(name) ? `There is a supply ${name} already.` : null)}
            onCommit={(name) =>
              edit(`Rename supply ${supply.name}`, (board) => changeSupply(board, supply.name, { name }))
            }
          />
          {voltages.map(([key, label]) => (
            <QuantityField
              key={key}
              label={label}
              unit="V"
              value={supply[key]}
              {...range(supply, key)}
              disabled={disabled}
              onCommit={(value) =>
                value !== null &&
                edit(`Change ${label.toLowerCase()} voltage of ${supply.name}`, (board) =>
                  changeSupply(board, supply.name, { [key]: value }),
                )
              }
            />
          ))}
          {disabled ? null : (
            <Button
              size="small"
              variant="danger"
              aria-label={`Remove supply ${supply.name}`}
              onClick={() => edit(`Remove supply ${supply.name}`, (board) => removeSupply(board, supply.name))}
            >
              Remove
            </Button>
          )}
        </div>
      ))}
    </Section>
  );
}

/** Each voltage stays in order with its neighbours. */
function range({ minV, nominalV, maxV }: Supply, key: (typeof voltages)[number][0]) {
  return {
    minV: { minimum: 0, maximum: nominalV },
    nominalV: { minimum: minV, maximum: maxV },
    maxV: { minimum: nominalV, maximum: 2000 },
  }[key];
}

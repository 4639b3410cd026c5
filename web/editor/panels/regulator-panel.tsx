import { changeRegulator } from '#core/board/edits/change-regulator.ts';
import { renameObject } from '#core/board/edits/rename-object.ts';
import type { Regulator, Side } from '#core/board/placement.ts';
import { formatGiven } from '#core/format.ts';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { SelectField } from '#web/ui/select-field.tsx';
import { useEditor } from '../editor-context.ts';
import { netNames } from '../net-names.ts';
import { objectKey } from '#core/board/object-key.ts';
import { DropperFields } from './dropper-fields.tsx';
import { FeedField } from './feed-field.tsx';
import { Group, Wide } from './group.tsx';
import { LandNetFields } from './land-net-fields.tsx';
import { LoadField } from './load-field.tsx';
import { NameField } from './name-field.tsx';
import { PlaceFields } from './place-fields.tsx';
import { RegulatorResultLines } from './regulator-result-lines.tsx';
import { takenName } from './taken-name.ts';
import { useEdit } from './use-edit.ts';

/** A regulator in figures: what came out, where it sits, what it is joined to, what feeds it. */
export function RegulatorPanel({ regulator }: { regulator: Regulator }) {
  const board = useEditor((state) => state.board);
  const { edit, disabled } = useEdit();
  const { ref } = regulator;
  const key = objectKey('regulator', ref);
  const part = board.parts[regulator.part];
  const nets = netNames(board);
  const change = (what: string, patch: Partial<Regulator>) =>
    edit(`Change ${what} of ${ref}`, (before) => changeRegulator(before, ref, patch));
  return (
    <>
      <RegulatorResultLines regulatorRef={ref} />
      <Group title="Placement">
        <NameField
          label="Reference"
          value={ref}
          maxLength={40}
          disabled={disabled}
          refuse={(text) => takenName(board, text)}
          onCommit={(text) => edit(`Rename ${ref} to ${text}`, (before) => renameObject(before, key, text))}
        />
        <SelectField<Side>
          label="Side"
          value={regulator.side}
          disabled={disabled}
          options={[
            { value: 'top', label: 'Top' },
            { value: 'bottom', label: 'Bottom' },
          ]}
          onChange={(side) => change('the side', { side })}
        />
        <PlaceFields objectKey={key} at={regulator.at} rotationDeg={regulator.rotationDeg} />
      </Group>
      <Group
        title="Part"
        note={
          part
            ? `${formatGiven(part.outputV, 'V')} ± ${formatGiven(part.outputTolerancePct, '%')}, ${formatGiven(part.outputMaxA, 'A')} at most, input at most ${formatGiven(part.inputMaxV, 'V')}, junction at most ${formatGiven(part.junctionMaxC, '°C')}. ${part.source}`
            : 'The part is not in this document.'
        }
      >
        <Wide>
          <SelectField
            label="Part"
            value={regulator.part}
            disabled={disabled}
            options={Object.entries(board.parts).map(([value, { name, package: outline }]) => ({
              value,
              label: `${name}, ${board.packages[outline]?.name ?? outline}`,
            }))}
            onChange={(value) => change('the part', { part: value })}
          />
        </Wide>
        {part ? <LandNetFields partKey={regulator.part} part={part} /> : null}
      </Group>
      <Group title="Nets">
        {(['ground', 'input', 'output'] as const).map((role) => (
          <NameField
            key={role}
            label={role === 'ground' ? 'Ground' : role === 'input' ? 'Input' : 'Output'}
            value={regulator.nets[role]}
            offered={nets}
            disabled={disabled}
            onCommit={(net) => change(`the ${role} net`, { nets: { ...regulator.nets, [role]: net } })}
          />
        ))}
      </Group>
      <Group title="Feed and power">
        <LoadField objectRef={ref} field="loadsA" />
        <FeedField regulator={regulator} onChange={(feed) => change('the feed', { feed })} disabled={disabled} />
        <QuantityField
          label="Known dissipation"
          unit="W"
          value={regulator.powerW}
          minimum={0}
          maximum={500}
          optional
          disabled={disabled}
          onCommit={(powerW) => change('the dissipation', { powerW })}
        />
        <DropperFields
          dropper={regulator.dropper}
          sources={board.sources.map((source) => source.ref)}
          disabled={disabled}
          onChange={(dropper) => change('the dropper', { dropper })}
        />
      </Group>
    </>
  );
}

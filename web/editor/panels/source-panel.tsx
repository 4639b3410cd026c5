import { changeSource } from '#core/board/edits/change-source.ts';
import { renameObject } from '#core/board/edits/rename-object.ts';
import type { HeatSource, Side } from '#core/board/placement.ts';
import { formatQuantity } from '#core/format.ts';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { SelectField } from '#web/ui/select-field.tsx';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';
import { activeCheck } from '../canvas/use-heat-picture.ts';
import { useEditor } from '../editor-context.ts';
import { objectKey } from '#core/board/object-key.ts';
import { Group } from './group.tsx';
import { LoadField } from './load-field.tsx';
import { NameField } from './name-field.tsx';
import { PlaceFields } from './place-fields.tsx';
import { SizeFields } from './size-fields.tsx';
import { takenName } from './taken-name.ts';
import { useEdit } from './use-edit.ts';

/** A heat source in figures. */
export function SourcePanel({ source }: { source: HeatSource }) {
  const board = useEditor((state) => state.board);
  const check = useEditor(activeCheck);
  const { edit, disabled } = useEdit();
  const { ref } = source;
  const key = objectKey('source', ref);
  const result = check?.condition.sources.find((candidate) => candidate.ref === ref);
  const change = (what: string, patch: Partial<HeatSource>) =>
    edit(`Change ${what} of ${ref}`, (before) => changeSource(before, ref, patch));
  return (
    <>
      {result ? (
        <section aria-label={`Result of ${ref}`} className="border-b border-line px-4 py-3">
          <p className="flex flex-wrap items-baseline gap-x-3">
            <span className="text-xl font-semibold">{formatQuantity(result.temperatureC, '°C')}</span>
            <span className="text-sm text-ink-soft">at most {formatQuantity(result.maxC, '°C')}</span>
            <VerdictMark verdict={result.verdict} />
          </p>
        </section>
      ) : null}
      <Group title="Heat source">
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
          value={source.side}
          disabled={disabled}
          options={[
            { value: 'top', label: 'Top' },
            { value: 'bottom', label: 'Bottom' },
          ]}
          onChange={(side) => change('the side', { side })}
        />
        <PlaceFields objectKey={key} at={source.at} rotationDeg={source.rotationDeg} />
        <SizeFields
          sizeMm={source.sizeMm}
          minimum={0.05}
          maximum={200}
          disabled={disabled}
          onChange={(sizeMm) => change('the size', { sizeMm })}
        />
      </Group>
      <Group
        title="Heat"
        note="Without a power it is heated only by droppers that name it. What a condition says goes before."
      >
        <QuantityField
          label="Power"
          unit="W"
          value={source.powerW}
          minimum={0}
          maximum={500}
          optional
          disabled={disabled}
          onCommit={(powerW) => change('the power', { powerW })}
        />
        <LoadField objectRef={ref} field="powersW" />
        <QuantityField
          label="Limit"
          unit="°C"
          value={source.limitC}
          minimum={-50}
          maximum={500}
          optional
          disabled={disabled}
          onCommit={(limitC) => change('the limit', { limitC })}
        />
      </Group>
    </>
  );
}

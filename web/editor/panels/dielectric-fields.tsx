import { changeDielectric } from '#core/board/edits/change-dielectric.ts';
import type { DielectricLayer } from '#core/board/stackup.ts';
import { useQuery } from '@tanstack/react-query';
import { libraryQuery } from '#web/library/library-query.ts';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { SelectField } from '#web/ui/select-field.tsx';
import { Group } from './group.tsx';
import { useEdit } from './use-edit.ts';

/** One laminate layer between two copper layers, its conductivities typed or taken from the library. */
export function DielectricFields({ layer, index }: { layer: DielectricLayer; index: number }) {
  const { edit, disabled } = useEdit();
  const library = useQuery(libraryQuery);
  const laminates = library.data?.laminates ?? [];
  const change = (what: string, patch: Partial<DielectricLayer>) =>
    edit(`Change ${what} of laminate ${index + 1}`, (board) => changeDielectric(board, index, patch));
  const known = laminates.find(
    (candidate) =>
      candidate.layer.inPlaneWPerMK === layer.inPlaneWPerMK && candidate.layer.throughWPerMK === layer.throughWPerMK,
  );
  const conductivity = { unit: 'W/(m·K)', minimum: 0.05, maximum: 500, disabled };
  return (
    <Group title={`Laminate ${index + 1}`} note={known?.source}>
      <QuantityField
        label="Thickness"
        unit="mm"
        value={layer.thicknessMm}
        minimum={0.01}
        maximum={10}
        disabled={disabled}
        onCommit={(thicknessMm) => thicknessMm !== null && change('the thickness', { thicknessMm })}
      />
      <SelectField
        label="Material"
        value={known?.name ?? ''}
        disabled={disabled}
        options={[{ value: '', label: 'own values' }, ...laminates.map(({ name }) => ({ value: name, label: name }))]}
        onChange={(name) => {
          const chosen = laminates.find((candidate) => candidate.name === name);
          if (chosen) change('the material', chosen.layer);
        }}
      />
      <QuantityField
        {...conductivity}
        label="Conductivity in plane"
        value={layer.inPlaneWPerMK}
        onCommit={(inPlaneWPerMK) => inPlaneWPerMK !== null && change('the conductivity', { inPlaneWPerMK })}
      />
      <QuantityField
        {...conductivity}
        label="Conductivity through"
        value={layer.throughWPerMK}
        onCommit={(throughWPerMK) => throughWPerMK !== null && change('the conductivity', { throughWPerMK })}
      />
    </Group>
  );
}

import { addCopperLayer } from '#core/board/edits/add-copper-layer.ts';
import { changeStackup } from '#core/board/edits/change-stackup.ts';
import type { Stackup } from '#core/board/stackup.ts';
import { formatGiven } from '#core/format.ts';
import { Button } from '#web/ui/button.tsx';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { CopperLayerFields } from './copper-layer-fields.tsx';
import { DielectricFields } from './dielectric-fields.tsx';
import { Group } from './group.tsx';
import { useEdit } from './use-edit.ts';

/** Copper and laminate from top to bottom, the faces, and what the laminate stands. */
export function StackupForm({ stackup }: { stackup: Stackup }) {
  const { edit, disabled } = useEdit();
  const thicknessMm =
    stackup.dielectric.reduce((sum, layer) => sum + layer.thicknessMm, 0) +
    stackup.copper.reduce((sum, layer) => sum + layer.thicknessUm / 1000, 0);
  const face = { unit: '', minimum: 0.01, maximum: 1, disabled };
  return (
    <>
      <h2 className="px-4 pt-3 pb-1 text-base">
        Stack-up, {stackup.copper.length} copper {stackup.copper.length === 1 ? 'layer' : 'layers'},{' '}
        {formatGiven(thicknessMm, 'mm', 3)}
      </h2>
      {stackup.copper.map((layer, index) => {
        const below = stackup.dielectric[index];
        return (
          <div key={layer.name}>
            <CopperLayerFields layer={layer} index={index} count={stackup.copper.length} />
            {below ? <DielectricFields layer={below} index={index} /> : null}
          </div>
        );
      })}
      <div className="border-b border-line px-4 py-3">
        <Button
          size="small"
          disabled={disabled || stackup.copper.length >= 32}
          onClick={() => edit('Add a copper layer', addCopperLayer)}
        >
          Add a copper layer below
        </Button>
      </div>
      <Group title="Faces and laminate">
        <QuantityField
          {...face}
          label="Emissivity, top"
          value={stackup.emissivityTop}
          onCommit={(emissivityTop) =>
            emissivityTop !== null && edit('Change the emissivity', (board) => changeStackup(board, { emissivityTop }))
          }
        />
        <QuantityField
          {...face}
          label="Emissivity, bottom"
          value={stackup.emissivityBottom}
          onCommit={(emissivityBottom) =>
            emissivityBottom !== null &&
            edit('Change the emissivity', (board) => changeStackup(board, { emissivityBottom }))
          }
        />
        <QuantityField
          label="Maximum operating temperature"
          unit="°C"
          value={stackup.maxOperatingC}
          minimum={50}
          maximum={400}
          disabled={disabled}
          onCommit={(maxOperatingC) =>
            maxOperatingC !== null &&
            edit('Change the maximum operating temperature', (board) => changeStackup(board, { maxOperatingC }))
          }
        />
      </Group>
    </>
  );
}

import { changeCopperLayer } from '#core/board/edits/change-copper-layer.ts';
import { removeCopperLayer } from '#core/board/edits/remove-copper-layer.ts';
import type { CopperLayer } from '#core/board/stackup.ts';
import { Button } from '#web/ui/button.tsx';
import { CheckField } from '#web/ui/check-field.tsx';
import { QuantityField } from '#web/ui/quantity-field.tsx';
import { useEditor } from '../editor-context.ts';
import { layerUsers } from '../layer-users.ts';
import { netNames } from '../net-names.ts';
import { Group, Wide } from './group.tsx';
import { NameField } from './name-field.tsx';
import { useEdit } from './use-edit.ts';

type Props = { layer: CopperLayer; index: number; count: number };

/** One copper layer: name, thickness, plane, background traces. */
export function CopperLayerFields({ layer, index, count }: Props) {
  const board = useEditor((state) => state.board);
  const { edit, disabled } = useEdit();
  const users = layerUsers(board, layer.name);
  const change = (what: string, patch: Partial<CopperLayer>) =>
    edit(`Change ${what} of ${layer.name}`, (before) => changeCopperLayer(before, index, patch));
  const { plane } = layer;
  return (
    <Group title={`Copper ${layer.name}`}>
      <NameField
        label="Name"
        value={layer.name}
        disabled={disabled}
        refuse={(text) =>
          board.stackup.copper.some(({ name }) => name === text) ? `${text} is the name of another layer.` : null
        }
        onCommit={(name) => change('the name', { name })}
      />
      <QuantityField
        label="Thickness"
        unit="µm"
        value={layer.thicknessUm}
        minimum={1}
        maximum={500}
        disabled={disabled}
        onCommit={(thicknessUm) => thicknessUm !== null && change('the thickness', { thicknessUm })}
      />
      <Wide>
        <CheckField
          label="Plane over the whole board"
          checked={plane !== null}
          disabled={disabled}
          onChange={(event) =>
            change('the plane', { plane: event.target.checked ? { net: 'GND', coverage: 1, insetMm: 0.5 } : null })
          }
        />
      </Wide>
      {plane ? (
        <>
          <NameField
            label="Net of the plane"
            value={plane.net}
            offered={netNames(board)}
            disabled={disabled}
            onCommit={(net) => change('the plane', { plane: { ...plane, net } })}
          />
          <QuantityField
            label="Coverage"
            unit="%"
            value={plane.coverage * 100}
            minimum={0}
            maximum={100}
            disabled={disabled}
            onCommit={(percent) =>
              percent !== null && change('the plane', { plane: { ...plane, coverage: percent / 100 } })
            }
          />
          <QuantityField
            label="Inset from the edge"
            unit="mm"
            value={plane.insetMm}
            minimum={0}
            maximum={100}
            disabled={disabled}
            onCommit={(insetMm) => insetMm !== null && change('the plane', { plane: { ...plane, insetMm } })}
          />
        </>
      ) : null}
      <QuantityField
        label="Traces on no net"
        unit="%"
        value={layer.traces ? layer.traces.coverage * 100 : null}
        minimum={0}
        maximum={100}
        optional
        disabled={disabled}
        onCommit={(percent) => change('the traces', { traces: percent === null ? null : { coverage: percent / 100 } })}
      />
      {count > 1 ? (
        <div className="self-end">
          <Button
            size="small"
            variant="quiet"
            disabled={disabled || users.length > 0}
            title={users.length > 0 ? `In use by ${users.slice(0, 5).join(', ')}` : undefined}
            onClick={() => edit(`Remove layer ${layer.name}`, (before) => removeCopperLayer(before, index))}
          >
            Remove {layer.name}
          </Button>
          {users.length > 0 ? <p className="text-ink-soft">in use by {users.slice(0, 3).join(', ')}</p> : null}
        </div>
      ) : null}
    </Group>
  );
}

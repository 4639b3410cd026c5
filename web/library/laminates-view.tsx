import type { LibraryView } from '#core/contract/solving.ts';
import { formatGiven } from '#core/format.ts';
import { Cell, Row, Table } from '#web/ui/table.tsx';

const head = [
  { label: 'Laminate' },
  { label: 'In plane in W/(m·K)', numeric: true },
  { label: 'Through in W/(m·K)', numeric: true },
  { label: 'Source' },
];

/** Laminates with their conductivities. */
export function LaminatesView({ laminates }: { laminates: LibraryView['laminates'] }) {
  return (
    <Table caption="Laminates" head={head}>
      {laminates.map(({ name, layer, source }) => (
        <Row key={name}>
          <Cell className="font-semibold">{name}</Cell>
          <Cell numeric>{formatGiven(layer.inPlaneWPerMK)}</Cell>
          <Cell numeric>{formatGiven(layer.throughWPerMK)}</Cell>
          <Cell className="min-w-64 text-sm">{source}</Cell>
        </Row>
      ))}
    </Table>
  );
}

import { formatGiven } from '#core/format.ts';
import { Cell, Row, Table } from '#web/ui/table.tsx';

type Props = { title: string; unit: string; points: readonly (readonly [number, number])[] };

/** Value over output current; straight between the points. */
export function CurrentTable({ title, unit, points }: Props) {
  return (
    <section>
      <h3 className="mb-1">{title}</h3>
      <Table
        caption={`${title} over output current`}
        head={[
          { label: 'Output current in A', numeric: true },
          { label: `Value in ${unit}`, numeric: true },
        ]}
      >
        {points.map(([current, value]) => (
          <Row key={current}>
            <Cell numeric>{formatGiven(current)}</Cell>
            <Cell numeric>{formatGiven(value)}</Cell>
          </Row>
        ))}
      </Table>
    </section>
  );
}

import type { Rail } from '#core/electrical/rail-table.ts';
import { formatNumber, formatRatio } from '#core/format.ts';
import { Cell, Row, Table } from '#web/ui/table.tsx';

const head = [
  { label: 'Rail' },
  { label: 'From' },
  { label: 'Vin lowest V', numeric: true },
  { label: 'Nominal V', numeric: true },
  { label: 'Highest V', numeric: true },
  { label: 'Vout V', numeric: true },
  { label: 'Iout A', numeric: true },
  { label: 'Headroom V', numeric: true },
  { label: 'Heat at highest W', numeric: true },
  { label: 'Heat at lowest W', numeric: true },
  { label: 'Efficiency', numeric: true },
  { label: 'Ground current share', numeric: true },
  { label: 'State' },
];

/** Every rail with both of its corners in one row. */
export function RailsTable({ rails }: { rails: readonly Rail[] }) {
  return (
    <Table caption="Rails" head={head}>
      {rails.map((rail) => (
        <Row key={rail.ref}>
          <th scope="row" className="py-3 pr-6 text-left align-baseline font-semibold whitespace-nowrap">
            {rail.ref} {rail.net ? <span className="font-normal text-ink-soft">{rail.net}</span> : null}
          </th>
          <Cell>{rail.source ?? '–'}</Cell>
          <Cell numeric>{formatNumber(rail.inputV.lowest, 2)}</Cell>
          <Cell numeric>{formatNumber(rail.inputV.nominal, 2)}</Cell>
          <Cell numeric>{formatNumber(rail.inputV.highest, 2)}</Cell>
          <Cell numeric>{formatNumber(rail.outputV, 2)}</Cell>
          <Cell numeric>{formatNumber(rail.outputA, 3)}</Cell>
          <Cell numeric>{formatNumber(rail.headroomV, 2)}</Cell>
          <Cell numeric>{formatNumber(rail.heatW, 3)}</Cell>
          <Cell numeric>{formatNumber(rail.lowInputHeatW, 3)}</Cell>
          <Cell numeric>{formatRatio(rail.efficiency, 1)}</Cell>
          <Cell numeric>{formatRatio(rail.quiescentShare, 2)}</Cell>
          <Cell className={rail.state === 'regulates' ? undefined : 'font-semibold'}>{rail.state}</Cell>
        </Row>
      ))}
    </Table>
  );
}

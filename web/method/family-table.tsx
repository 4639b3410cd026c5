import { errorStatistics, type ErrorStatistics } from '#core/accuracy/error-statistics.ts';
import type { PublishedCase } from '#core/accuracy/published-case.ts';
import { Cell, Row, Table } from '#web/ui/table.tsx';
import { percent } from './percent.ts';

const head = [
  { label: 'Boards' },
  { label: 'Number', numeric: true },
  { label: 'Mean', numeric: true },
  { label: 'Mean absolute', numeric: true },
  { label: 'Root mean square', numeric: true },
  { label: 'Worst', numeric: true },
];

/** Errors by outline, and of all. */
export function FamilyTable({ still, moving }: { still: readonly PublishedCase[]; moving: readonly PublishedCase[] }) {
  const families = [...new Set(still.map((one) => one.family))];
  const rows: [string, ErrorStatistics][] = families.map((family) => [
    family,
    errorStatistics(still.filter((one) => one.family === family)),
  ]);
  return (
    <Table caption="Errors of the method by package outline" head={head}>
      {rows.map(([name, statistics]) => (
        <Line key={name} name={name} {...statistics} />
      ))}
      <Line name="All in still air" strong {...errorStatistics(still)} />
      <Line name="Moving air" {...errorStatistics(moving)} />
    </Table>
  );
}

type LineProps = ErrorStatistics & { name: string; strong?: boolean };

function Line({ name, strong, cases, mean, meanAbsolute, rms, worst }: LineProps) {
  return (
    <Row className={strong ? 'font-semibold' : ''}>
      <Cell>{name}</Cell>
      <Cell numeric>{cases}</Cell>
      <Cell numeric>{percent(mean)}</Cell>
      <Cell numeric>{percent(meanAbsolute)}</Cell>
      <Cell numeric>{percent(rms)}</Cell>
      <Cell numeric>{percent(worst)}</Cell>
    </Row>
  );
}

import { useState } from 'react';
import { errorOf } from '#core/accuracy/error-statistics.ts';
import type { PublishedCase } from '#core/accuracy/published-case.ts';
import { SelectField } from '#web/ui/select-field.tsx';
import { Cell, Row, Table } from '#web/ui/table.tsx';
import { percent } from './percent.ts';

type Order = 'list' | 'error' | 'published';
const orders: { value: Order; label: string }[] = [
  { value: 'list', label: 'As published' },
  { value: 'error', label: 'Largest error first' },
  { value: 'published', label: 'Largest resistance first' },
];

const head = [
  { label: 'Case' },
  { label: 'Outline' },
  { label: 'Published K/W', numeric: true },
  { label: 'Predicted K/W', numeric: true },
  { label: 'Error', numeric: true },
  { label: 'Grade' },
  { label: 'Origin' },
  { label: 'Source, assumption' },
];

/** Every published board, in an order of choice. */
export function CaseTable({ cases }: { cases: readonly PublishedCase[] }) {
  const [order, setOrder] = useState<Order>('list');
  const sorted = [...cases];
  if (order === 'error') sorted.sort((a, b) => Math.abs(errorOf(b)) - Math.abs(errorOf(a)));
  if (order === 'published') sorted.sort((a, b) => b.publishedKPerW - a.publishedKPerW);
  return (
    <>
      <div className="mb-3 max-w-64 print:hidden">
        <SelectField label="Order" value={order} onChange={setOrder} options={orders} />
      </div>
      <Table caption="Published test boards, published and predicted" head={head}>
        {sorted.map((one) => (
          <Row key={one.id}>
            <Cell className="font-semibold whitespace-nowrap">{one.id}</Cell>
            <Cell className="whitespace-nowrap">
              {one.airMPerS > 0 ? `${one.family}, ${one.airMPerS} m/s` : one.family}
            </Cell>
            <Cell numeric>{one.publishedKPerW.toFixed(1)}</Cell>
            <Cell numeric>{one.predictedKPerW.toFixed(1)}</Cell>
            <Cell numeric>{percent(errorOf(one))}</Cell>
            <Cell>{one.grade}</Cell>
            <Cell>{one.origin}</Cell>
            <Cell className="min-w-64 text-sm">
              {one.source}
              {one.assumption === null ? null : <span className="text-ink-soft"> Assumed: {one.assumption}.</span>}
              {one.contradiction === null ? null : <strong> Not counted: {one.contradiction}.</strong>}
            </Cell>
          </Row>
        ))}
      </Table>
    </>
  );
}

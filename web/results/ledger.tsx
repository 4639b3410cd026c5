import { formatNumber } from '#core/format.ts';
import type { ConditionResult } from '#core/result/result.ts';
import { Cell, Row, Table } from '#web/ui/table.tsx';

/** Heat ledger: what every source of heat adds to every junction, in kelvins; the largest of a row in bold. */
export function Ledger({ condition }: { condition: ConditionResult }) {
  const victims = condition.regulators.map(({ ref }) => ref);
  const sources = [...new Set(condition.ledger.map(({ source }) => source))];
  if (victims.length === 0 || sources.length === 0) {
    return <p className="text-sm text-ink-soft">No heat is given off in this condition.</p>;
  }
  const riseOf = (victim: string, source: string) =>
    condition.ledger.find((entry) => entry.victim === victim && entry.source === source)?.riseK ?? 0;
  return (
    <div className="min-w-0">
      <h3 className="mb-2 font-semibold">Heat ledger, K</h3>
      <Table
        caption="Heat ledger: rise of each junction by source, in kelvins"
        head={[
          { label: 'Junction' },
          ...sources.map((source) => ({ label: `from ${source}`, numeric: true })),
          { label: 'in all', numeric: true },
        ]}
      >
        {victims.map((victim) => {
          const rises = sources.map((source) => riseOf(victim, source));
          const most = Math.max(...rises);
          return (
            <Row key={victim} className="text-sm">
              <th scope="row" className="py-2 pr-6 text-left font-semibold">
                {victim}
              </th>
              {sources.map((source, index) => (
                <Cell key={source} numeric className={rises[index] === most ? 'py-2 font-semibold' : 'py-2'}>
                  {formatNumber(rises[index], 1)}
                </Cell>
              ))}
              <Cell numeric className="py-2">
                {formatNumber(
                  rises.reduce((sum, rise) => sum + rise, 0),
                  1,
                )}
              </Cell>
            </Row>
          );
        })}
      </Table>
    </div>
  );
}

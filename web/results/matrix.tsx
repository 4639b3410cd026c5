import type { CheckResult, RegulatorResult } from '#core/result/result.ts';
import { formatNumber, formatQuantity } from '#core/format.ts';
import { governingByRegulator, junctionLimit } from '#core/record/governing.ts';
import { classes } from '#web/ui/classes.ts';
import { Cell, Row, Table } from '#web/ui/table.tsx';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';

type Choice = { select?: string; condition: string };
type Props = {
  result: CheckResult;
  chosen: { ref: string | null; condition: string | null };
  onChoose: (choice: Choice) => void;
};

/** Regulators down, conditions across; the governing cell of each row says so in words. Other heat and probes stand below. */
export function Matrix({ result, chosen, onChoose }: Props) {
  const { conditions } = result;
  const [first] = conditions;
  if (!first) return null;
  const head = [{ label: 'Junction' }, ...conditions.map(({ name }) => ({ label: name }))];
  return (
    <section aria-label="Matrix">
      <h2 className="mb-3 text-lg font-semibold">Junctions by condition</h2>
      <Table caption="Junction temperatures, regulators by conditions" head={head}>
        {first.regulators.map(({ ref }) => {
          const governing = governingByRegulator(result).get(ref)?.condition.name;
          return (
            <Row key={ref}>
              <th scope="row" className="py-3 pr-6 text-left align-baseline font-semibold">
                {ref}
              </th>
              {conditions.map((condition) => {
                const regulator = condition.regulators.find((candidate) => candidate.ref === ref);
                const isChosen = chosen.ref === ref && chosen.condition === condition.name;
                return (
                  <td key={condition.name} className="p-0 align-top">
                    <button
                      type="button"
                      aria-pressed={isChosen}
                      onClick={() => onChoose({ select: ref, condition: condition.name })}
                      className={classes(
                        'w-full min-w-40 border-l-4 py-2.5 pr-4 pl-3 text-left hover:bg-copper-soft',
                        isChosen ? 'border-copper bg-copper-soft' : 'border-transparent',
                      )}
                    >
                      {regulator ? <JunctionCell regulator={regulator} governs={governing === condition.name} /> : '–'}
                    </button>
                  </td>
                );
              })}
            </Row>
          );
        })}
        {first.sources.map(({ ref }) => (
          <Row key={ref}>
            <th scope="row" className="py-2 pr-6 text-left align-baseline text-sm font-normal text-ink-soft">
              {ref}, mean
            </th>
            {conditions.map((condition) => {
              const source = condition.sources.find((candidate) => candidate.ref === ref);
              return (
                <Cell key={condition.name} className="pl-4 text-sm">
                  {formatQuantity(source?.temperatureC, '°C')}{' '}
                  {source && source.limitC !== null ? (
                    <VerdictMark verdict={source.verdict} size={11} />
                  ) : (
                    <span className="text-ink-soft">no limit</span>
                  )}
                </Cell>
              );
            })}
          </Row>
        ))}
        {first.probes.map(({ id }) => (
          <Row key={id}>
            <th scope="row" className="py-2 pr-6 text-left align-baseline text-sm font-normal text-ink-soft">
              Probe {id}
            </th>
            {conditions.map((condition) => (
              <Cell key={condition.name} className="pl-4 text-sm">
                {formatQuantity(condition.probes.find((probe) => probe.id === id)?.temperatureC, '°C')}
              </Cell>
            ))}
          </Row>
        ))}
      </Table>
    </section>
  );
}

function JunctionCell({ regulator, governs }: { regulator: RegulatorResult; governs: boolean }) {
  const { junctionC, uncertaintyK, verdict } = regulator;
  return (
    <>
      <span className="block">
        <span className="text-lg">{formatNumber(junctionC, 1)}</span>
        <span className="text-sm text-ink-soft"> ± {formatQuantity(uncertaintyK, 'K')}</span>
      </span>
      <span className="block text-sm">
        <VerdictMark verdict={verdict} size={12} />
      </span>
      <span className="block text-xs text-ink-soft">
        margin {formatQuantity(junctionLimit(regulator)?.margin, 'K')}
        {governs ? <strong className="text-ink"> · governs</strong> : null}
      </span>
    </>
  );
}

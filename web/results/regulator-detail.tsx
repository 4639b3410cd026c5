import type { Board } from '#core/board/document.ts';
import type { CheckResult, ConditionResult, LimitResult } from '#core/result/result.ts';
import { formatNumber, formatQuantity, formatRatio } from '#core/format.ts';
import { junctionLimit } from '#core/record/governing.ts';
import { RiseLadder } from '#web/ladder/rise-ladder.tsx';
import { Cell, Row, Table } from '#web/ui/table.tsx';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';

type Props = { result: CheckResult; condition: ConditionResult; reference: string; board: Board };

const quantityWords = {
  junctionC: 'Junction temperature',
  inputV: 'Input voltage',
  outputA: 'Output current',
} as const;
const units = { junctionC: '°C', inputV: 'V', outputA: 'A' } as const;
const marginUnits = { junctionC: 'K', inputV: 'V', outputA: 'A' } as const;

/** One regulator in one condition: why it is as hot as it is, against which limits, at which operating point. */
export function RegulatorDetail({ condition, reference, board }: Props) {
  const regulator = condition.regulators.find(({ ref }) => ref === reference);
  if (!regulator) return null;
  const settings = board.conditions.find(({ name }) => name === condition.name);
  const placed = board.regulators.find(({ ref }) => ref === reference);
  const part = placed && board.parts[placed.part];
  const facts: [string, string][] = [
    ['Input at the pin', formatQuantity(regulator.inputV, 'V')],
    ['Output', formatQuantity(regulator.outputV, 'V')],
    ['Output current', formatQuantity(regulator.outputA, 'A')],
    ['Ground current', formatQuantity(regulator.groundA, 'A', 4)],
    ['Dissipation', formatQuantity(regulator.dissipationW, 'W', 3)],
    ['Headroom at the lowest input', formatQuantity(regulator.headroomV, 'V')],
    [
      'Holds its output',
      regulator.regulating === null ? 'not stated' : regulator.regulating ? 'yes' : 'no: the output follows the input',
    ],
    ['Thermal shutdown', regulator.shutsDown ? 'reached: it cycles' : 'not reached'],
    ['Case top', formatQuantity(regulator.caseTopC, '°C')],
    ['Hottest land', formatQuantity(regulator.landC, '°C')],
    [
      'Grid error / model error',
      `${formatQuantity(regulator.gridErrorK, 'K')} / ${formatQuantity(regulator.modelErrorK, 'K')}`,
    ],
  ];
  return (
    <section aria-label={`${reference} in ${condition.name}`} className="border-t border-line-strong pt-4">
      <h2 className="text-lg font-semibold">
        {reference} {part ? <span className="font-normal text-ink-soft">{part.name}</span> : null} · {condition.name}{' '}
        <span className="ml-2 text-base">
          <VerdictMark verdict={regulator.verdict} />
        </span>
      </h2>
      <div className="mt-4 grid gap-8 lg:grid-cols-[minmax(20rem,1fr)_2fr]">
        <RiseLadder
          regulator={regulator}
          ambientC={settings?.ambientC ?? 0}
          limitC={junctionLimit(regulator)?.limit ?? null}
        />
        <div className="min-w-0">
          <Limits limits={regulator.limits} />
          <dl className="mt-6 grid grid-cols-2 gap-x-8 text-sm sm:grid-cols-3">
            {facts.map(([label, value]) => (
              <div key={label} className="border-b border-line py-1.5">
                <dt className="text-ink-soft">{label}</dt>
                <dd>{value}</dd>
              </div>
            ))}
          </dl>
          <p className="mt-4 max-w-prose text-sm text-ink-soft">
            θJA here: {formatQuantity(regulator.thetaJaKPerW, 'K/W')}, its neighbours’ heat included. It belongs to this
            board in this condition; the figure of a data sheet belongs to a test board.
          </p>
        </div>
      </div>
    </section>
  );
}

function Limits({ limits }: { limits: readonly LimitResult[] }) {
  const head = [
    { label: 'Quantity' },
    { label: 'Actual', numeric: true },
    { label: 'Derated limit', numeric: true },
    { label: 'Margin', numeric: true },
    { label: 'Stress ratio', numeric: true },
    { label: 'Verdict' },
    { label: 'Source' },
  ];
  return (
    <Table caption="Limits" head={head}>
      {limits.map((limit, index) => (
        <Row key={index} className="text-sm">
          <Cell>{quantityWords[limit.quantity]}</Cell>
          <Cell numeric>{formatQuantity(limit.actual, units[limit.quantity])}</Cell>
          <Cell numeric>{formatQuantity(limit.limit, units[limit.quantity])}</Cell>
          <Cell numeric>{formatQuantity(limit.margin, marginUnits[limit.quantity])}</Cell>
          <Cell numeric title={formatRatio(limit.ratio)}>
            {formatNumber(limit.ratio, 2)}
          </Cell>
          <Cell>
            <VerdictMark verdict={limit.verdict} size={11} />
          </Cell>
          <Cell className="min-w-48 break-words">{limit.source}</Cell>
        </Row>
      ))}
    </Table>
  );
}

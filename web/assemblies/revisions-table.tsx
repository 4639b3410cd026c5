import { Link } from 'react-router-dom';
import type { RevisionSummary } from '#core/contract/assemblies.ts';
import { paths } from '#web/paths.ts';
import { StateMark } from '#web/ui/state-mark.tsx';
import { Cell, Row, Table } from '#web/ui/table.tsx';
import { Timestamp } from '#web/ui/timestamp.tsx';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';

const head = [
  { label: 'Revision' },
  { label: 'State' },
  { label: 'Verdict' },
  { label: 'Changed' },
  { label: 'Pages', hidden: true },
];
const views = [
  { label: 'Sketch', to: paths.sketch },
  { label: 'Results', to: paths.results },
  { label: 'Review', to: paths.review },
  { label: 'Record', to: paths.record },
];

/** Revisions of one assembly, newest first, with the way to each page. */
export function RevisionsTable({ number, revisions }: { number: string; revisions: readonly RevisionSummary[] }) {
  return (
    <Table caption={`Revisions of ${number}`} head={head}>
      {revisions.map(({ id, letter, state, verdict, changedAt }) => (
        <Row key={id} className="hover:bg-panel">
          <Cell>
            <Link
              to={paths.sketch(id)}
              className="inline-block min-w-8 text-lg font-semibold underline decoration-line-strong underline-offset-4 hover:text-copper"
            >
              <span className="sr-only">Revision </span>
              {letter}
            </Link>
          </Cell>
          <Cell>
            <StateMark state={state} />
          </Cell>
          <Cell>
            {verdict ? <VerdictMark verdict={verdict} /> : <span className="text-ink-soft">Not checked yet</span>}
          </Cell>
          <Cell>
            <Timestamp at={changedAt} />
          </Cell>
          <Cell>
            <span className="flex justify-end gap-x-4">
              {views.map(({ label, to }) => (
                <Link
                  key={label}
                  to={to(id)}
                  className="inline-block py-0.5 text-sm underline decoration-line-strong underline-offset-4 hover:text-copper"
                >
                  {label} <span className="sr-only">of revision {letter}</span>
                </Link>
              ))}
            </span>
          </Cell>
        </Row>
      ))}
    </Table>
  );
}

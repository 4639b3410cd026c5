import { Link } from 'react-router-dom';
import type { AssemblyView } from '#core/contract/assemblies.ts';
import { paths } from '#web/paths.ts';
import { StateMark } from '#web/ui/state-mark.tsx';
import { Cell, Row, Table } from '#web/ui/table.tsx';
import { Timestamp } from '#web/ui/timestamp.tsx';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';

const head = [
  { label: 'Number' },
  { label: 'Title' },
  { label: 'Revision' },
  { label: 'State' },
  { label: 'Verdict' },
  { label: 'Changed' },
];

/** One line per assembly; the number leads to it, the letter straight to its newest revision. */
export function AssembliesTable({ assemblies }: { assemblies: readonly AssemblyView[] }) {
  return (
    <Table caption="Assemblies" head={head}>
      {assemblies.map(({ id, number, title, revisions }) => {
        const newest = revisions[0];
        return (
          <Row key={id} className="hover:bg-panel">
            <Cell className="whitespace-nowrap">
              <Link
                to={paths.assembly(id)}
                className="font-semibold underline decoration-line-strong underline-offset-4 hover:text-copper"
              >
                {number}
              </Link>
            </Cell>
            <Cell className="min-w-44">{title}</Cell>
            <Cell>
              {newest ? (
                <Link
                  to={paths.sketch(newest.id)}
                  className="inline-block min-w-6 py-0.5 underline decoration-line-strong underline-offset-4 hover:text-copper"
                >
                  <span className="sr-only">{number} revision </span>
                  {newest.letter}
                </Link>
              ) : (
                '–'
              )}
            </Cell>
            <Cell>{newest ? <StateMark state={newest.state} /> : '–'}</Cell>
            <Cell>
              {newest?.verdict ? (
                <VerdictMark verdict={newest.verdict} />
              ) : (
                <span className="whitespace-nowrap text-ink-soft">Not checked yet</span>
              )}
            </Cell>
            <Cell>{newest ? <Timestamp at={newest.changedAt} /> : '–'}</Cell>
          </Row>
        );
      })}
    </Table>
  );
}

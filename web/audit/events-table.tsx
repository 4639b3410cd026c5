import { Link } from 'react-router-dom';
import type { AuditEventView } from '#core/contract/review.ts';
import { paths } from '#web/paths.ts';
import { Cell, Row, Table } from '#web/ui/table.tsx';
import { Timestamp } from '#web/ui/timestamp.tsx';
import { eventWords, factLines } from './event-words.ts';

const head = [{ label: 'When' }, { label: 'Who' }, { label: 'What' }, { label: 'To what' }, { label: 'Facts' }];

type Props = { events: readonly AuditEventView[]; onRevision: (revisionId: string) => void };

/** Audit events; old values stand before an arrow, new ones behind it. */
export function EventsTable({ events, onRevision }: Props) {
  return (
    <Table caption="Audit events" head={head}>
      {events.map((event) => (
        <Row key={event.sequence}>
          <Cell>
            <Timestamp at={event.at} />
          </Cell>
          <Cell>{event.actor}</Cell>
          <Cell className="font-semibold">{eventWords(event.kind)}</Cell>
          <Cell>
            {event.revisionId ? (
              <RevisionOf subject={event.subject} revisionId={event.revisionId} onRevision={onRevision} />
            ) : (
              event.subject
            )}
          </Cell>
          <Cell className="min-w-56 text-sm">
            <Facts facts={event.facts} />
          </Cell>
        </Row>
      ))}
    </Table>
  );
}

type RevisionOfProps = { subject: string; revisionId: string; onRevision: (revisionId: string) => void };

function RevisionOf({ subject, revisionId, onRevision }: RevisionOfProps) {
  return (
    <>
      <Link
        to={paths.review(revisionId)}
        className="underline decoration-line-strong underline-offset-4 hover:text-copper"
      >
        {subject}
      </Link>
      <button
        type="button"
        onClick={() => onRevision(revisionId)}
        className="block min-h-6 text-left text-sm text-ink-soft underline decoration-line-strong underline-offset-4 hover:text-copper"
      >
        Only this one<span className="sr-only">: {subject}</span>
      </button>
    </>
  );
}

function Facts({ facts }: { facts: Record<string, unknown> }) {
  const lines = factLines(facts);
  if (lines.length === 0) return <span className="text-ink-soft">–</span>;
  return (
    <ul>
      {lines.map((fact) => (
        <li key={fact.name} className="break-words">
          <span className="text-ink-soft">{fact.name}:</span>{' '}
          {fact.before === undefined ? null : (
            <>
              <del className="text-ink-soft">{fact.before}</del>
              <span aria-hidden="true"> → </span>
              <span className="sr-only"> became </span>
            </>
          )}
          {fact.value}
        </li>
      ))}
    </ul>
  );
}

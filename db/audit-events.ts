import type { AuditKind } from '#core/review/audit-kinds.ts';
import type { Database } from './database.ts';

export type AuditEvent = {
  /** Order of events; the clock is only displayed. */
  sequence: number;
  at: Date;
  actor: string;
  kind: string;
  subject: string;
  revisionId: string | null;
  facts: Record<string, unknown>;
};

type Row = {
  sequence: string;
  at: Date;
  actor: string;
  kind: string;
  subject: string;
  revision_id: string | null;
  facts: Record<string, unknown>;
};

/** Appends an event; nothing ever changes or removes one. `actor` null: the service itself. */
export async function appendAuditEvent(
  database: Database,
  given: {
    teamId: string;
    actor: { id: string; name: string } | null;
    kind: AuditKind;
    subject: string;
    revisionId?: string;
    facts?: Record<string, unknown>;
  },
): Promise<void> {
  await database('audit_events').insert({
    team_id: given.teamId,
    actor_id: given.actor?.id ?? null,
    actor: given.actor?.name ?? 'Dropwatt',
    kind: given.kind,
    subject: given.subject,
    revision_id: given.revisionId ?? null,
    facts: JSON.stringify(given.facts ?? {}),
  });
}

/** Events before a sequence number, newest first. */
export async function listAuditEvents(
  database: Database,
  teamId: string,
  search: {
    before: number | null;
    limit: number;
    revisionId?: string | undefined;
    kind?: string | undefined;
  },
): Promise<AuditEvent[]> {
  const rows = await database('audit_events')
    .where({ team_id: teamId })
    .modify((query) => {
      if (search.before !== null) void query.where('sequence', '<', search.before);
      if (search.revisionId) void query.where('revision_id', search.revisionId);
      if (search.kind) void query.where('kind', search.kind);
    })
    .orderBy('sequence', 'desc')
    .limit(search.limit)
    .select<Row[]>('sequence', 'at', 'actor', 'kind', 'subject', 'revision_id', 'facts');
  return rows.map((row) => ({
    sequence: Number(row.sequence),
    at: row.at,
    actor: row.actor,
    kind: row.kind,
    subject: row.subject,
    revisionId: row.revision_id,
    facts: row.facts,
  }));
}

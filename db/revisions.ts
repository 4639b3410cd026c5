import type { Verdict } from '#core/result/result.ts';
import type { RevisionState } from '#core/review/revision-state.ts';
import type { Database } from './database.ts';

export type Revision = {
  id: string;
  teamId: string;
  assembly: { id: string; number: string; title: string };
  letter: string;
  /** 1 for the first revision of the assembly. */
  ordinal: number;
  state: RevisionState;
  /** Counts every save and every change of state. */
  version: number;
  stateReason: string | null;
  /** Version at which the present sketch was saved. */
  sketchVersion: number;
  sketchHash: string;
  /** Result that was signed; null before clearing. */
  resultId: string | null;
  /** What the record says of people and papers, frozen at the issue; null before. */
  issuedFacts: object | null;
  createdAt: Date;
  changedAt: Date;
  changedBy: string;
};

type Row = {
  id: string;
  team_id: string;
  assembly_id: string;
  number: string;
  title: string;
  letter: string;
  ordinal: number;
  state: RevisionState;
  version: number;
  state_reason: string | null;
  sketch_version: number;
  sketch_hash: string;
  result_id: string | null;
  issued_facts: object | null;
  created_at: Date;
  changed_at: Date;
  changed_by_name: string;
};

const revision = (row: Row): Revision => ({
  id: row.id,
  teamId: row.team_id,
  assembly: { id: row.assembly_id, number: row.number, title: row.title },
  letter: row.letter,
  ordinal: row.ordinal,
  state: row.state,
  version: row.version,
  stateReason: row.state_reason,
  sketchVersion: row.sketch_version,
  sketchHash: row.sketch_hash,
  resultId: row.result_id,
  issuedFacts: row.issued_facts,
  createdAt: row.created_at,
  changedAt: row.changed_at,
  changedBy: row.changed_by_name,
});

/** Inserts a revision in state `sketch`; its first sketch version must follow in the same transaction. */
export async function insertRevision(
  database: Database,
  given: {
    id: string;
    teamId: string;
    assemblyId: string;
    letter: string;
    ordinal: number;
    sketchHash: string;
    createdBy: string;
  },
): Promise<void> {
  await database('revisions').insert({
    id: given.id,
    team_id: given.teamId,
    assembly_id: given.assemblyId,
    letter: given.letter,
    ordinal: given.ordinal,
    state: 'sketch',
    sketch_hash: given.sketchHash,
    created_by: given.createdBy,
    changed_by: given.createdBy,
  });
}

export async function findRevision(database: Database, teamId: string, id: string): Promise<Revision | null> {
  const row: Row | undefined = await selected(database).where({ 'r.team_id': teamId, 'r.id': id }).first();
  return row ? revision(row) : null;
}

/**
 * As `findRevision`, holding the row until the transaction ends. Locked by itself and read afterwards: after a wait
 * PostgreSQL looks at the row anew, but joins it to what it was joined to before, and a change of `changed_by` would
 * make it vanish.
 */
export async function lockRevision(database: Database, teamId: string, id: string): Promise<Revision | null> {
  const held: unknown = await database('revisions').where({ team_id: teamId, id }).forUpdate().first('id');
  return held === undefined ? null : findRevision(database, teamId, id);
}

/** Every revision of an assembly, newest first. */
export async function revisionsOf(database: Database, teamId: string, assemblyId: string): Promise<Revision[]> {
  const rows: Row[] = await selected(database)
    .where({ 'r.team_id': teamId, 'r.assembly_id': assemblyId })
    .orderBy('r.ordinal', 'desc');
  return rows.map(revision);
}

export type RevisionLine = {
  id: string;
  assemblyId: string;
  letter: string;
  state: RevisionState;
  verdict: Verdict | null;
  changedAt: Date;
};

/** Revisions of one or all assemblies, newest first, each with the verdict of the result that counts for its present sketch. */
export async function revisionLines(
  database: Database,
  teamId: string,
  method: string,
  assemblyId: string | null = null,
): Promise<RevisionLine[]> {
  const rows = await database('revisions as r')
    .leftJoin('results as signed', 'signed.id', 'r.result_id')
    .leftJoin('results as present', (join) =>
      join
        .on('present.team_id', 'r.team_id')
        .andOn('present.input_hash', 'r.sketch_hash')
        .andOnVal('present.method', method),
    )
    .where('r.team_id', teamId)
    .modify((query) => void (assemblyId && query.where('r.assembly_id', assemblyId)))
    .orderBy('r.ordinal', 'desc')
    .select<
      {
        id: string;
        assembly_id: string;
        letter: string;
        state: RevisionState;
        verdict: Verdict | null;
        changed_at: Date;
      }[]
    >('r.id', 'r.assembly_id', 'r.letter', 'r.state', 'r.changed_at')
    .select(database.raw('coalesce(signed.verdict, present.verdict) as verdict'));
  return rows.map((row) => ({
    id: row.id,
    assemblyId: row.assembly_id,
    letter: row.letter,
    state: row.state,
    verdict: row.verdict,
    changedAt: row.changed_at,
  }));
}

export type RevisionChange = {
  state?: RevisionState;
  stateReason?: string | null;
  /** The sketch saved with this very change. */
  sketchHash?: string;
  resultId?: string;
  issuedFacts?: object;
};

/**
 * Changes a revision that is still at `overVersion` and counts its version up, in one statement.
 * @returns the new version and time; null when somebody else was first
 */
export async function changeRevision(
  database: Database,
  id: string,
  overVersion: number,
  changedBy: string,
  change: RevisionChange,
): Promise<{ version: number; changedAt: Date } | null> {
  const rows = await database('revisions')
    .where({ id, version: overVersion })
    .update({
      version: overVersion + 1,
      changed_at: database.fn.now(),
      changed_by: changedBy,
      ...(change.state ? { state: change.state } : {}),
      ...(change.stateReason === undefined ? {} : { state_reason: change.stateReason }),
      ...(change.sketchHash ? { sketch_hash: change.sketchHash, sketch_version: overVersion + 1 } : {}),
      ...(change.resultId ? { result_id: change.resultId } : {}),
      ...(change.issuedFacts ? { issued_facts: JSON.stringify(change.issuedFacts) } : {}),
    })
    .returning<{ version: number; changed_at: Date }[]>(['version', 'changed_at']);
  const [row] = rows;
  return row ? { version: row.version, changedAt: row.changed_at } : null;
}

function selected(database: Database) {
  return database('revisions as r')
    .join('assemblies as a', 'a.id', 'r.assembly_id')
    .join('members as m', 'm.id', 'r.changed_by')
    .select('r.*', 'a.number', 'a.title', 'm.name as changed_by_name');
}

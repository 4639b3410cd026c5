import type { Database } from './database.ts';

export type Assembly = { id: string; teamId: string; number: string; title: string; createdAt: Date };

type Row = { id: string; team_id: string; number: string; title: string; created_at: Date };

const assembly = (row: Row): Assembly => ({
  id: row.id,
  teamId: row.team_id,
  number: row.number,
  title: row.title,
  createdAt: row.created_at,
});

export async function insertAssembly(
  database: Database,
  given: { id: string; teamId: string; number: string; title: string; createdBy: string },
): Promise<void> {
  await database('assemblies').insert({
    id: given.id,
    team_id: given.teamId,
    number: given.number,
    title: given.title,
    created_by: given.createdBy,
  });
}

export async function listAssemblies(database: Database, teamId: string): Promise<Assembly[]> {
  const rows = await database('assemblies').where({ team_id: teamId }).orderBy('number').select<Row[]>('*');
  return rows.map(assembly);
}

export async function findAssembly(database: Database, teamId: string, id: string): Promise<Assembly | null> {
  const row = await database('assemblies').where({ team_id: teamId, id }).first<Row | undefined>('*');
  return row ? assembly(row) : null;
}

/** Locks the assembly: one next letter, one issued revision at a time. */
export async function lockAssembly(database: Database, teamId: string, id: string): Promise<Assembly | null> {
  const row = await database('assemblies').where({ team_id: teamId, id }).forUpdate().first<Row | undefined>('*');
  return row ? assembly(row) : null;
}

export async function numberTaken(
  database: Database,
  teamId: string,
  number: string,
  except: string | null,
): Promise<boolean> {
  const row: unknown = await database('assemblies')
    .where({ team_id: teamId, number })
    .modify((query) => void (except && query.whereNot('id', except)))
    .first('id');
  return row !== undefined;
}

export async function updateAssembly(
  database: Database,
  id: string,
  change: { number?: string | undefined; title?: string | undefined },
): Promise<void> {
  await database('assemblies').where({ id }).update(change);
}

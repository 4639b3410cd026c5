import type { CheckResult, Verdict } from '#core/result/result.ts';
import type { Database } from './database.ts';

export type StoredCheck = { id: string; inputHash: string; method: string; result: CheckResult; solvedAt: Date };

type Row = { id: string; input_hash: string; method: string; result: CheckResult; solved_at: Date };

const stored = (row: Row): StoredCheck => ({
  id: row.id,
  inputHash: row.input_hash,
  method: row.method,
  result: row.result,
  solvedAt: row.solved_at,
});

/** Stores a result once per input and method; gives the id of the row that was new, null when it was there already. */
export async function insertResult(
  database: Database,
  given: {
    id: string;
    teamId: string;
    inputHash: string;
    method: string;
    verdict: Verdict;
    result: CheckResult;
  },
): Promise<string | null> {
  const rows = await database('results')
    .insert({
      id: given.id,
      team_id: given.teamId,
      input_hash: given.inputHash,
      method: given.method,
      verdict: given.verdict,
      result: JSON.stringify(given.result),
    })
    .onConflict(['team_id', 'input_hash', 'method'])
    .ignore()
    .returning<{ id: string }[]>('id');
  return rows[0]?.id ?? null;
}

export async function findResult(
  database: Database,
  teamId: string,
  inputHash: string,
  method: string,
): Promise<StoredCheck | null> {
  const row = await database('results')
    .where({ team_id: teamId, input_hash: inputHash, method })
    .first<Row | undefined>('*');
  return row ? stored(row) : null;
}

export async function hasResult(
  database: Database,
  teamId: string,
  inputHash: string,
  method: string,
): Promise<boolean> {
  const row: unknown = await database('results').where({ team_id: teamId, input_hash: inputHash, method }).first('id');
  return row !== undefined;
}

export async function findResultById(database: Database, teamId: string, id: string): Promise<StoredCheck | null> {
  const row = await database('results').where({ team_id: teamId, id }).first<Row | undefined>('*');
  return row ? stored(row) : null;
}

/**
 * Newest result of any sketch of a revision, whatever its method, with the version of the newest sketch that it
 * belongs to. The newest sketch that has one wins.
 */
export async function newestResultOf(
  database: Database,
  teamId: string,
  revisionId: string,
): Promise<(StoredCheck & { sketchVersion: number }) | null> {
  const row = await database('sketch_versions as s')
    .join('results as r', (join) => join.on('r.input_hash', 's.board_hash').andOnVal('r.team_id', teamId))
    .where('s.revision_id', revisionId)
    .orderBy([
      { column: 's.version', order: 'desc' },
      { column: 'r.solved_at', order: 'desc' },
    ])
    .first<(Row & { version: number }) | undefined>(
      'r.id',
      'r.input_hash',
      'r.method',
      'r.result',
      'r.solved_at',
      's.version',
    );
  return row ? { ...stored(row), sketchVersion: row.version } : null;
}

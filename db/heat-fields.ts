import type { Database } from './database.ts';

/** Packed heat fields of one result, by condition. */
export async function insertHeatFields(
  database: Database,
  resultId: string,
  fields: ReadonlyMap<string, Uint8Array>,
): Promise<void> {
  for (const [condition, field] of fields) {
    await database('heat_fields').insert({ result_id: resultId, condition, field: Buffer.from(field) });
  }
}

export async function findHeatField(
  database: Database,
  resultId: string,
  condition: string,
): Promise<Uint8Array | null> {
  const row = await database('heat_fields')
    .where({ result_id: resultId, condition })
    .first<{ field: Buffer } | undefined>('field');
  return row?.field ?? null;
}

export async function listHeatFields(database: Database, resultId: string): Promise<Map<string, Uint8Array>> {
  const rows = await database('heat_fields')
    .where({ result_id: resultId })
    .select<{ condition: string; field: Buffer }[]>('condition', 'field');
  return new Map(rows.map((row) => [row.condition, row.field]));
}

import { type Database, only } from './database.ts';

export type KeptAnswer = { endpoint: string; requestHash: string; status: number; answer: unknown };

/**
 * Takes a key for this transaction; waits while another one holds it.
 * @returns null when the key is new, otherwise the request that used it and its answer
 */
export async function takeKey(
  database: Database,
  given: { memberId: string; key: string; endpoint: string; requestHash: string },
): Promise<KeptAnswer | null> {
  const inserted = await database('idempotency_keys')
    .insert({
      member_id: given.memberId,
      key: given.key,
      endpoint: given.endpoint,
      request_hash: given.requestHash,
    })
    .onConflict(['member_id', 'key'])
    .ignore()
    .returning<{ key: string }[]>('key');
  if (inserted.length === 1) return null;
  const row = only(
    await database('idempotency_keys')
      .where({ member_id: given.memberId, key: given.key })
      .select<{ endpoint: string; request_hash: string; status: number; answer: unknown }[]>('*'),
  );
  return { endpoint: row.endpoint, requestHash: row.request_hash, status: row.status, answer: row.answer };
}

export async function keepAnswer(
  database: Database,
  given: { memberId: string; key: string; status: number; answer: unknown },
): Promise<void> {
  await database('idempotency_keys')
    .where({ member_id: given.memberId, key: given.key })
    .update({ status: given.status, answer: JSON.stringify(given.answer) });
}

/** Keys are good for a day. */
export async function removeOldKeys(database: Database): Promise<void> {
  await database('idempotency_keys').whereRaw("created_at < now() - interval '1 day'").delete();
}

import type { Request } from 'express';
import { createHash } from 'node:crypto';
import type { Database } from '#db/database.ts';
import { keepAnswer, takeKey } from '#db/idempotency-keys.ts';
import { transaction } from '#db/transaction.ts';
import type { Deps } from '../deps.ts';
import type { Actor } from '../session/actor.ts';
import { invalid, Refusal } from './refusal.ts';

type Call = { name: string; actor: Actor; request: Request; params: unknown; written: unknown; status: number };
type Answer = { body?: unknown; version?: number; status?: number };

/**
 * Acts in one transaction, together with the caller's Idempotency-Key where there is one: the same key and request
 * gets the first answer again, also while the first one is still running.
 */
export async function once<T extends Answer>(
  deps: Deps,
  call: Call,
  act: (database: Database) => Promise<T>,
): Promise<Answer> {
  const key = call.request.get('idempotency-key');
  if (key === undefined) return transaction(deps.database, act);
  if (!/^[\x21-\x7e]{8,200}$/.test(key))
    throw invalid([{ path: 'Idempotency-Key', message: 'must be 8 to 200 visible ASCII characters' }]);
  const memberId = call.actor.member.id;
  const requestHash = createHash('sha256')
    .update(JSON.stringify([call.name, call.params, call.written]))
    .digest('hex');
  return transaction(deps.database, async (trx) => {
    const kept = await takeKey(trx, { memberId, key, endpoint: call.name, requestHash });
    if (kept && kept.requestHash !== requestHash)
      throw new Refusal(
        422,
        'key-reused',
        'Key used before',
        'This Idempotency-Key belongs to another request. Take a new key for a new intent.',
      );
    if (kept) return { ...(kept.answer as Answer), status: kept.status };
    const answer = await act(trx);
    await keepAnswer(trx, {
      memberId,
      key,
      status: answer.status ?? call.status,
      answer: { body: answer.body, version: answer.version },
    });
    return answer;
  });
}

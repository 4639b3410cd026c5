import { appendAuditEvent } from '#db/audit-events.ts';
import { clearAttempts, forgiveAttempt } from '#db/attempt-counters.ts';
import { findByEmail } from '#db/members.ts';
import { findLiveSession } from '#db/sessions.ts';
import { transaction } from '#db/transaction.ts';
import type { Deps } from '../deps.ts';
import { Refusal } from '../http/refusal.ts';
import type { Actor } from './actor.ts';
import { limitAttempts, perAccount, perAddress } from './limit-attempts.ts';
import { openSession } from './open-session.ts';

/** Opens a session for an address and its password; failures are counted before any hash is made. */
export async function signIn(
  deps: Deps,
  given: { email: string; password: string; address: string },
): Promise<{ token: string; actor: Actor }> {
  const account = `sign-in account ${given.email}`;
  const address = `sign-in address ${given.address}`;
  await limitAttempts(deps.database, [
    { key: account, limit: perAccount },
    { key: address, limit: perAddress },
  ]);
  const member = await findByEmail(deps.database, given.email);
  const matched = await deps.passwords.matches(given.password, member?.passwordHash ?? null);
  if (!member || !matched)
    throw new Refusal(401, 'sign-in-failed', 'Not signed in', 'Address or password is not right.');
  return transaction(deps.database, async (trx) => {
    await clearAttempts(trx, account);
    await forgiveAttempt(trx, address);
    const opened = await openSession(deps, trx, member.id);
    const actor = await findLiveSession(trx, opened.id);
    if (!actor) throw new Refusal(401, 'sign-in-failed', 'Not signed in', 'Address or password is not right.');
    await appendAuditEvent(trx, { teamId: member.teamId, actor: member, kind: 'session.opened', subject: member.name });
    return { token: opened.token, actor };
  });
}

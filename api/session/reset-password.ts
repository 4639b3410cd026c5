import { appendAuditEvent } from '#db/audit-events.ts';
import { findByEmail, setPasswordHash } from '#db/members.ts';
import { insertReset, useReset } from '#db/password-resets.ts';
import { endSessionsOf } from '#db/sessions.ts';
import { transaction } from '#db/transaction.ts';
import type { Deps } from '../deps.ts';
import { Refusal } from '../http/refusal.ts';
import { passwordResetNotice } from '../mail/notices/password-reset-notice.ts';
import { queueMail } from '../mail/queue-mail.ts';
import { limitAttempts, perAddress } from './limit-attempts.ts';
import { hashOfToken, newToken } from './one-time-token.ts';

/** Sends a reset link if the address is known; the answer is the same if it is not. */
export async function requestReset(deps: Deps, given: { email: string; address: string }): Promise<void> {
  await limitAttempts(deps.database, [
    { key: `reset account ${given.email}`, limit: { attempts: 5, windowSeconds: 3600 } },
    { key: `reset address ${given.address}`, limit: perAddress },
  ]);
  const member = await findByEmail(deps.database, given.email);
  if (!member) return;
  const { token, tokenHash } = newToken();
  await transaction(deps.database, async (trx) => {
    await insertReset(trx, { id: deps.newId(), memberId: member.id, tokenHash });
    await queueMail(deps, trx, member.teamId, member, passwordResetNotice(deps.publicUrl, { token, ...member }));
    await appendAuditEvent(trx, {
      teamId: member.teamId,
      actor: null,
      kind: 'password.reset-requested',
      subject: member.name,
    });
  });
}

/** Sets a new password with the link and ends every session of the member. */
export async function completeReset(
  deps: Deps,
  given: { token: string; password: string; address: string },
): Promise<void> {
  await limitAttempts(deps.database, [{ key: `link address ${given.address}`, limit: perAddress }]);
  const passwordHash = await deps.passwords.hash(given.password);
  await transaction(deps.database, async (trx) => {
    const member = await useReset(trx, hashOfToken(given.token));
    if (!member)
      throw new Refusal(
        422,
        'link-ended',
        'Link no longer valid',
        'The link was used or is too old. Ask for a new one.',
      );
    await setPasswordHash(trx, member.memberId, passwordHash);
    await endSessionsOf(trx, member.memberId);
    await appendAuditEvent(trx, {
      teamId: member.teamId,
      actor: { id: member.memberId, name: member.name },
      kind: 'password.reset',
      subject: member.name,
    });
  });
}

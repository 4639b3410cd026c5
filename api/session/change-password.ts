import { appendAuditEvent } from '#db/audit-events.ts';
import { setPasswordHash } from '#db/members.ts';
import { endSessionsOf } from '#db/sessions.ts';
import { transaction } from '#db/transaction.ts';
import type { Deps } from '../deps.ts';
import type { Actor } from './actor.ts';
import { confirmPassword } from './confirm-password.ts';

/** Changes the own password; every other session of the member ends. */
export async function changePassword(
  deps: Deps,
  actor: Actor,
  given: { currentPassword: string; newPassword: string },
): Promise<void> {
  await confirmPassword(deps, actor, given.currentPassword, 'currentPassword');
  const passwordHash = await deps.passwords.hash(given.newPassword);
  await transaction(deps.database, async (trx) => {
    await setPasswordHash(trx, actor.member.id, passwordHash);
    const ended = await endSessionsOf(trx, actor.member.id, actor.id);
    await appendAuditEvent(trx, {
      teamId: actor.team.id,
      actor: actor.member,
      kind: 'password.changed',
      subject: actor.member.name,
      facts: { otherSessionsEnded: ended },
    });
  });
}

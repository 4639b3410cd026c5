import { clearAttempts } from '#db/attempt-counters.ts';
import { passwordHashOf } from '#db/members.ts';
import type { Deps } from '../deps.ts';
import { invalid } from '../http/refusal.ts';
import type { Actor } from './actor.ts';
import { limitAttempts, perAccount } from './limit-attempts.ts';

/**
 * Asks the signed-in member's password once more.
 * @param field of the body that held it, named in the refusal
 */
export async function confirmPassword(deps: Deps, actor: Actor, password: string, field: string): Promise<void> {
  const key = `confirm ${actor.member.id}`;
  await limitAttempts(deps.database, [{ key, limit: perAccount }]);
  const hash = await passwordHashOf(deps.database, actor.member.id);
  if (!(await deps.passwords.matches(password, hash)))
    throw invalid([{ path: field, message: 'is not your password' }]);
  await clearAttempts(deps.database, key);
}

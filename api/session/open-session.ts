import type { Database } from '#db/database.ts';
import { insertSession } from '#db/sessions.ts';
import type { Deps } from '../deps.ts';
import { signSessionToken } from './session-token.ts';

export type OpenedSession = { id: string; token: string; expiresAt: Date };

export async function openSession(deps: Deps, database: Database, memberId: string): Promise<OpenedSession> {
  const id = deps.newId();
  const expiresAt = await insertSession(database, { id, memberId, hours: deps.sessionHours });
  return { id, token: signSessionToken(deps.sessionSecret, id, expiresAt), expiresAt };
}

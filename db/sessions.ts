import type { Role } from '#core/review/role.ts';
import { type Database, only } from './database.ts';

export type LiveSession = {
  id: string;
  expiresAt: Date;
  member: { id: string; name: string; email: string; roles: Role[] };
  team: { id: string; name: string };
};

/** Opens a session that ends by itself after `hours`, by the database's clock. */
export async function insertSession(
  database: Database,
  session: { id: string; memberId: string; hours: number },
): Promise<Date> {
  const rows = await database('sessions')
    .insert({
      id: session.id,
      member_id: session.memberId,
      expires_at: database.raw('now() + make_interval(secs => ?)', [session.hours * 3600]),
    })
    .returning<{ expires_at: Date }[]>('expires_at');
  return only(rows).expires_at;
}

/** The session with its member as they are now; null when it has ended, run out, or the member was removed. */
export async function findLiveSession(database: Database, id: string): Promise<LiveSession | null> {
  const row = await database('sessions as s')
    .join('members as m', 'm.id', 's.member_id')
    .join('teams as t', 't.id', 'm.team_id')
    .where('s.id', id)
    .whereNull('s.ended_at')
    .whereNull('m.removed_at')
    .whereRaw('s.expires_at > now()')
    .first<
      | {
          expires_at: Date;
          member_id: string;
          name: string;
          email: string;
          roles: Role[];
          team_id: string;
          team: string;
        }
      | undefined
    >('s.expires_at', 'm.id as member_id', 'm.name', 'm.email', 'm.roles', 't.id as team_id', 't.name as team');
  if (!row) return null;
  return {
    id,
    expiresAt: row.expires_at,
    member: { id: row.member_id, name: row.name, email: row.email, roles: row.roles },
    team: { id: row.team_id, name: row.team },
  };
}

export async function endSession(database: Database, id: string): Promise<void> {
  await database('sessions').where({ id }).whereNull('ended_at').update({ ended_at: database.fn.now() });
}

/** Ends every session of a member but `keep`; gives how many. */
export async function endSessionsOf(database: Database, memberId: string, keep: string | null = null): Promise<number> {
  return database('sessions')
    .where({ member_id: memberId })
    .whereNull('ended_at')
    .modify((query) => void (keep && query.whereNot('id', keep)))
    .update({ ended_at: database.fn.now() });
}

/** Forgets sessions that ended or ran out more than 30 days ago. */
export async function removeOldSessions(database: Database): Promise<void> {
  await database('sessions').whereRaw("least(expires_at, ended_at) < now() - interval '30 days'").delete();
}

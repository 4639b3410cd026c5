import type { Database } from './database.ts';

/** A reset link opens once, within an hour. */
export async function insertReset(
  database: Database,
  reset: { id: string; memberId: string; tokenHash: string },
): Promise<void> {
  await database('password_resets').insert({
    id: reset.id,
    member_id: reset.memberId,
    token_hash: reset.tokenHash,
    expires_at: database.raw("now() + interval '1 hour'"),
  });
}

/** Uses up the link and every other open one of the member; gives who it belongs to, null when it does not open. */
export async function useReset(
  database: Database,
  tokenHash: string,
): Promise<{ memberId: string; name: string; teamId: string } | null> {
  const rows = await database('password_resets')
    .where({ token_hash: tokenHash })
    .whereNull('used_at')
    .whereRaw('expires_at > now()')
    .update({ used_at: database.fn.now() })
    .returning<{ member_id: string }[]>('member_id');
  const [row] = rows;
  if (!row) return null;
  await database('password_resets')
    .where({ member_id: row.member_id })
    .whereNull('used_at')
    .update({ used_at: database.fn.now() });
  const member = await database('members')
    .where({ id: row.member_id })
    .whereNull('removed_at')
    .first<{ name: string; team_id: string } | undefined>('name', 'team_id');
  return member ? { memberId: row.member_id, name: member.name, teamId: member.team_id } : null;
}

export async function removeOldResets(database: Database): Promise<void> {
  await database('password_resets').whereRaw("expires_at < now() - interval '30 days'").delete();
}

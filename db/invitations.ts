import type { Role } from '#core/review/role.ts';
import type { Database } from './database.ts';

export type Invitation = {
  id: string;
  teamId: string;
  team: string;
  name: string;
  email: string;
  roles: Role[];
  invitedBy: string;
  createdAt: Date;
  expiresAt: Date;
};

type Row = {
  id: string;
  team_id: string;
  team: string;
  name: string;
  email: string;
  roles: Role[];
  invited_by: string;
  created_at: Date;
  expires_at: Date;
};

const invitation = (row: Row): Invitation => ({
  id: row.id,
  teamId: row.team_id,
  team: row.team,
  name: row.name,
  email: row.email,
  roles: row.roles,
  invitedBy: row.invited_by,
  createdAt: row.created_at,
  expiresAt: row.expires_at,
});

export const invitationDays = 7;

export async function insertInvitation(
  database: Database,
  given: {
    id: string;
    teamId: string;
    name: string;
    email: string;
    roles: readonly Role[];
    tokenHash: string;
    invitedBy: string;
  },
): Promise<void> {
  await database('invitations').insert({
    id: given.id,
    team_id: given.teamId,
    name: given.name,
    email: given.email,
    roles: given.roles,
    token_hash: given.tokenHash,
    invited_by: given.invitedBy,
    expires_at: database.raw('now() + make_interval(days => ?)', [invitationDays]),
  });
}

/** Invitations that can still be accepted, newest first. */
export async function listOpenInvitations(database: Database, teamId: string): Promise<Invitation[]> {
  const rows: Row[] = await open(database).where('i.team_id', teamId).orderBy('i.created_at', 'desc');
  return rows.map(invitation);
}

export async function findOpenInvitation(database: Database, teamId: string, id: string): Promise<Invitation | null> {
  const row: Row | undefined = await open(database).where({ 'i.team_id': teamId, 'i.id': id }).first();
  return row ? invitation(row) : null;
}

export async function findInvitationByToken(database: Database, tokenHash: string): Promise<Invitation | null> {
  const row: Row | undefined = await open(database).where('i.token_hash', tokenHash).first();
  return row ? invitation(row) : null;
}

/** Takes back the open invitation of an address, also one that has run out, so that a new one can be sent. */
export async function withdrawInvitationsTo(database: Database, teamId: string, email: string): Promise<void> {
  await database('invitations')
    .where({ team_id: teamId, email })
    .whereNull('accepted_at')
    .whereNull('withdrawn_at')
    .update({ withdrawn_at: database.fn.now() });
}

export async function withdrawInvitation(database: Database, id: string): Promise<void> {
  await database('invitations').where({ id }).update({ withdrawn_at: database.fn.now() });
}

/** False when somebody else was quicker with the same link. */
export async function markAccepted(database: Database, id: string): Promise<boolean> {
  const count = await database('invitations')
    .where({ id })
    .whereNull('accepted_at')
    .whereNull('withdrawn_at')
    .update({ accepted_at: database.fn.now() });
  return count === 1;
}

/** Addresses that a team has ever invited. */
export async function invitedAddresses(database: Database, teamId: string): Promise<string[]> {
  return database('invitations').where({ team_id: teamId }).distinct().pluck('email');
}

function open(database: Database) {
  return database('invitations as i')
    .join('members as m', 'm.id', 'i.invited_by')
    .join('teams as t', 't.id', 'i.team_id')
    .whereNull('i.accepted_at')
    .whereNull('i.withdrawn_at')
    .whereRaw('i.expires_at > now()')
    .select('i.id', 'i.team_id', 't.name as team', 'i.name', 'i.email', 'i.roles', 'm.name as invited_by')
    .select('i.created_at', 'i.expires_at');
}

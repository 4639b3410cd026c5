import type { Role } from '#core/review/role.ts';
import type { Database } from './database.ts';

export type Member = {
  id: string;
  teamId: string;
  name: string;
  email: string;
  roles: Role[];
  joinedAt: Date;
  removedAt: Date | null;
};

type Row = {
  id: string;
  team_id: string;
  name: string;
  email: string;
  password_hash: string;
  roles: Role[];
  joined_at: Date;
  removed_at: Date | null;
};

const member = (row: Row): Member => ({
  id: row.id,
  teamId: row.team_id,
  name: row.name,
  email: row.email,
  roles: row.roles,
  joinedAt: row.joined_at,
  removedAt: row.removed_at,
});

export async function insertMember(
  database: Database,
  given: Omit<Member, 'joinedAt' | 'removedAt'> & { passwordHash: string },
): Promise<void> {
  await database('members').insert({
    id: given.id,
    team_id: given.teamId,
    name: given.name,
    email: given.email,
    roles: given.roles,
    password_hash: given.passwordHash,
  });
}

/** Present and removed members, by name. */
export async function listMembers(database: Database, teamId: string): Promise<Member[]> {
  const rows = await database('members').where({ team_id: teamId }).orderBy(['name', 'id']).select<Row[]>('*');
  return rows.map(member);
}

export async function findMember(database: Database, teamId: string, id: string): Promise<Member | null> {
  const row = await database('members').where({ team_id: teamId, id }).first<Row | undefined>('*');
  return row ? member(row) : null;
}

/** The present member who signs in with this address, with the password's hash. */
export async function findByEmail(
  database: Database,
  email: string,
): Promise<(Member & { passwordHash: string }) | null> {
  const row = await database('members').where({ email }).whereNull('removed_at').first<Row | undefined>('*');
  return row ? { ...member(row), passwordHash: row.password_hash } : null;
}

export async function passwordHashOf(database: Database, id: string): Promise<string | null> {
  const row = await database('members').where({ id }).first<Pick<Row, 'password_hash'> | undefined>('password_hash');
  return row?.password_hash ?? null;
}

/** Present members of a team who hold one of the roles. */
export async function membersWithRole(database: Database, teamId: string, roles: readonly Role[]): Promise<Member[]> {
  const rows = await database('members')
    .where({ team_id: teamId })
    .whereNull('removed_at')
    .whereRaw('roles && ?::text[]', [[...roles]])
    .orderBy(['name', 'id'])
    .select<Row[]>('*');
  return rows.map(member);
}

/** Those of some people who are still members. */
export async function presentMembers(
  database: Database,
  teamId: string,
  people: readonly { id: string }[],
): Promise<Member[]> {
  const rows = await database('members')
    .where({ team_id: teamId })
    .whereNull('removed_at')
    .whereIn(
      'id',
      people.map(({ id }) => id),
    )
    .orderBy(['name', 'id'])
    .select<Row[]>('*');
  return rows.map(member);
}

/** Locks the team's present members, so that the last administrator cannot be lost to two changes at once. */
export async function lockPresentMembers(database: Database, teamId: string): Promise<Member[]> {
  const rows = await database('members')
    .where({ team_id: teamId })
    .whereNull('removed_at')
    .orderBy('id')
    .forUpdate()
    .select<Row[]>('*');
  return rows.map(member);
}

export async function updateMember(
  database: Database,
  id: string,
  change: { name?: string | undefined; roles?: readonly Role[] | undefined },
): Promise<void> {
  await database('members').where({ id }).update(change);
}

export async function setPasswordHash(database: Database, id: string, passwordHash: string): Promise<void> {
  await database('members').where({ id }).update({ password_hash: passwordHash });
}

export async function markRemoved(database: Database, id: string): Promise<void> {
  await database('members').where({ id }).whereNull('removed_at').update({ removed_at: database.fn.now() });
}

import type { Role } from '#core/review/role.ts';
import { appendAuditEvent } from '#db/audit-events.ts';
import type { Database } from '#db/database.ts';
import { insertMember } from '#db/members.ts';
import { insertTeam, type Team } from '#db/teams.ts';
import type { Deps } from '../deps.ts';

export type FirstMember = { name: string; email: string; roles: Role[]; passwordHash: string };
export type CreatedMember = { id: string; name: string; email: string; roles: Role[] };

/** Makes a team with the members who are there from the start. */
export async function createTeam(
  deps: Pick<Deps, 'newId'>,
  database: Database,
  given: { name: string; members: readonly FirstMember[] },
): Promise<{ team: Team; members: CreatedMember[] }> {
  const team = { id: deps.newId(), name: given.name };
  await insertTeam(database, team);
  await appendAuditEvent(database, { teamId: team.id, actor: null, kind: 'team.created', subject: team.name });
  const members: CreatedMember[] = [];
  for (const { passwordHash, ...person } of given.members) {
    const member = { id: deps.newId(), ...person };
    await insertMember(database, { ...member, teamId: team.id, passwordHash });
    await appendAuditEvent(database, {
      teamId: team.id,
      actor: null,
      kind: 'member.joined',
      subject: member.name,
      facts: { email: member.email, roles: member.roles },
    });
    members.push(member);
  }
  return { team, members };
}

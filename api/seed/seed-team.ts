import type { Knex } from 'knex';
import type { Role } from '#core/review/role.ts';
import { putLibraryItem } from '#db/library-items.ts';
import { insertMember } from '#db/members.ts';
import { insertTeam } from '#db/teams.ts';
import type { Deps } from '../deps.ts';
import type { Actor } from '../session/actor.ts';
import type { PasswordHasher } from '../session/password-hasher.ts';
import { type Demo, demoTeam } from './demo-files.ts';

export type DemoActor = Pick<Actor, 'member' | 'team'>;
export type DemoPeople = (role: Role) => DemoActor;

/** Team, one member per role, and the team's parts. */
export async function seedTeam(
  deps: Pick<Deps, 'newId'>,
  trx: Knex.Transaction,
  passwords: PasswordHasher,
  demo: Demo,
): Promise<DemoPeople> {
  const team = { id: deps.newId(), name: demoTeam };
  await insertTeam(trx, team);
  const hashes = new Map<string, string>();
  const actors = new Map<Role, DemoActor>();
  for (const { name, email, roles, password } of demo.people) {
    // One shared demo password: hashed once, as each hash takes a third of a second.
    const passwordHash = hashes.get(password) ?? (await passwords.hash(password));
    hashes.set(password, passwordHash);
    const member = { id: deps.newId(), teamId: team.id, name, email, roles };
    await insertMember(trx, { ...member, passwordHash });
    for (const role of roles) actors.set(role, { team, member });
  }
  for (const [key, document] of Object.entries(demo.parts))
    await putLibraryItem(trx, team.id, { kind: 'part', key, document });
  return (role) => {
    const actor = actors.get(role);
    if (!actor) throw new Error(`the demo has no ${role}`);
    return actor;
  };
}

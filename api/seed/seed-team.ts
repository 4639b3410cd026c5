import type { Knex } from 'knex';
import type { Role } from '#core/review/role.ts';
import { putLibraryItem } from '#db/library-items.ts';
import type { Deps } from '../deps.ts';
import type { Actor } from '../session/actor.ts';
import type { PasswordHasher } from '../session/password-hasher.ts';
import { createTeam, type FirstMember } from '../team/create-team.ts';
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
  const hashes = new Map<string, string>();
  const given: FirstMember[] = [];
  for (const { name, email, roles, password } of demo.people) {
    // One shared demo password: hashed once, as each hash takes a third of a second.
    const passwordHash = hashes.get(password) ?? (await passwords.hash(password));
    hashes.set(password, passwordHash);
    given.push({ name, email, roles, passwordHash });
  }
  const { team, members } = await createTeam(deps, trx, { name: demoTeam, members: given });
  for (const [key, document] of Object.entries(demo.parts))
    await putLibraryItem(trx, team.id, { kind: 'part', key, document });
  return (role) => {
    const member = members.find(({ roles }) => roles.includes(role));
    if (!member) throw new Error(`the demo has no ${role}`);
    return { team, member };
  };
}

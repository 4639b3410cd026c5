import type { Role } from '#core/review/role.ts';
import { appendAuditEvent } from '#db/audit-events.ts';
import type { Database } from '#db/database.ts';
import { findMember, lockPresentMembers, markRemoved, type Member, updateMember } from '#db/members.ts';
import { endSessionsOf } from '#db/sessions.ts';
import { transaction } from '#db/transaction.ts';
import { notFound, Refusal } from '../http/refusal.ts';
import type { Actor } from '../session/actor.ts';

/** Changes name or roles; roles count from the member's next request on. */
export async function changeMember(
  database: Database,
  actor: Actor,
  memberId: string,
  change: { name?: string | undefined; roles?: Role[] | undefined },
): Promise<Member> {
  return transaction(database, async (trx) => {
    const { member, others } = await lockMember(trx, actor, memberId);
    const isAdministrator = (change.roles ?? member.roles).includes('administrator');
    if (!isAdministrator) keepAnAdministrator(member, others);
    const { name = member.name, roles = member.roles } = change;
    const facts = {
      ...(name === member.name ? {} : { name: { from: member.name, to: name } }),
      ...(sameRoles(roles, member.roles) ? {} : { roles: { from: member.roles, to: roles } }),
    };
    if (Object.keys(facts).length === 0) return member;
    await updateMember(trx, member.id, { name, roles });
    await appendAuditEvent(trx, {
      teamId: actor.team.id,
      actor: actor.member,
      kind: 'member.changed',
      subject: member.name,
      facts,
    });
    return { ...member, name, roles };
  });
}

/** Removes a member; their sessions end at once, what they did stays under their name. */
export async function removeMember(database: Database, actor: Actor, memberId: string): Promise<void> {
  await transaction(database, async (trx) => {
    const { member, others } = await lockMember(trx, actor, memberId);
    keepAnAdministrator(member, others);
    await markRemoved(trx, member.id);
    const ended = await endSessionsOf(trx, member.id);
    await appendAuditEvent(trx, {
      teamId: actor.team.id,
      actor: actor.member,
      kind: 'member.removed',
      subject: member.name,
      facts: { email: member.email, roles: member.roles, sessionsEnded: ended },
    });
  });
}

async function lockMember(database: Database, actor: Actor, memberId: string) {
  const present = await lockPresentMembers(database, actor.team.id);
  const member = present.find(({ id }) => id === memberId);
  if (member) return { member, others: present.filter(({ id }) => id !== memberId) };
  if (await findMember(database, actor.team.id, memberId))
    throw new Refusal(409, 'member-removed', 'Not a member any more', 'This member was removed from the team.');
  throw notFound('This member');
}

function keepAnAdministrator(member: Member, others: readonly Member[]): void {
  if (!member.roles.includes('administrator') || others.some(({ roles }) => roles.includes('administrator'))) return;
  throw new Refusal(
    409,
    'last-administrator',
    'Last administrator',
    'A team keeps at least one administrator. Give somebody else the role first.',
  );
}

function sameRoles(a: readonly Role[], b: readonly Role[]): boolean {
  return a.length === b.length && a.every((role) => b.includes(role));
}

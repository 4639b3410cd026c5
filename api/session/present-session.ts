import type { SessionView } from '#core/contract/people.ts';
import { allowedTeamActions } from '#core/review/permissions.ts';
import type { LiveSession } from '#db/sessions.ts';

export function presentSession({ member, team, expiresAt }: Omit<LiveSession, 'id'>): SessionView {
  return { member, team, allowed: allowedTeamActions(member.roles), expiresAt: expiresAt.toISOString() };
}

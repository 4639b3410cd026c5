import type { RevisionState } from './revision-state.ts';
import { transitions } from './revision-state.ts';
import type { Role } from './role.ts';

/** What a member may do to a revision; the API enforces it and sends it along as "what you may do with this record". */
export type RevisionAction =
  'edit' | 'solve' | 'comment' | 'submit' | 'send-back' | 'clear' | 'issue' | 'withdraw' | 'open-next';

/** What a member may do in the team, whatever the revision. */
export type TeamAction = 'create-assembly' | 'read-audit' | 'manage-members' | 'read-mail';

type Rule = { roles: readonly Role[]; states: readonly RevisionState[]; notAuthor?: true };

const editors = ['layout-designer', 'hardware-lead'] as const;
/** Everybody who works on boards; an administrator alone does not. */
export const technicalRoles = [
  'layout-designer',
  'thermal-reviewer',
  'quality-engineer',
  'hardware-lead',
  'test-engineer',
] as const;
const open = ['sketch', 'in review', 'sent back', 'cleared'] as const;

export const revisionRules: Record<RevisionAction, Rule> = {
  edit: { roles: editors, states: ['sketch', 'sent back'] },
  solve: { roles: technicalRoles, states: open },
  comment: { roles: technicalRoles, states: open },
  submit: { roles: editors, states: transitions.submit.from },
  'send-back': { roles: ['thermal-reviewer'], states: transitions['send-back'].from },
  clear: { roles: ['thermal-reviewer'], states: transitions.clear.from, notAuthor: true },
  issue: { roles: ['quality-engineer'], states: transitions.issue.from, notAuthor: true },
  withdraw: { roles: ['hardware-lead', 'quality-engineer'], states: transitions.withdraw.from },
  'open-next': { roles: editors, states: ['cleared', 'issued', 'withdrawn'] },
};

export const teamRules: Record<TeamAction, readonly Role[]> = {
  'create-assembly': editors,
  'read-audit': ['quality-engineer', 'hardware-lead', 'administrator'],
  'manage-members': ['administrator'],
  'read-mail': ['administrator'],
};

export type Refusal = 'role' | 'state' | 'author';

/** Why a member with these roles may not act on a revision in this state; null when they may. */
export function refusal(
  action: RevisionAction,
  roles: readonly Role[],
  state: RevisionState,
  isAuthor: boolean,
): Refusal | null {
  const rule = revisionRules[action];
  if (!rule.roles.some((role) => roles.includes(role))) return 'role';
  if (!rule.states.includes(state)) return 'state';
  return rule.notAuthor && isAuthor ? 'author' : null;
}

export function allowedRevisionActions(
  roles: readonly Role[],
  state: RevisionState,
  isAuthor: boolean,
): RevisionAction[] {
  return (Object.keys(revisionRules) as RevisionAction[]).filter(
    (action) => refusal(action, roles, state, isAuthor) === null,
  );
}

export function allowedTeamActions(roles: readonly Role[]): TeamAction[] {
  return (Object.keys(teamRules) as TeamAction[]).filter((action) =>
    teamRules[action].some((role) => roles.includes(role)),
  );
}

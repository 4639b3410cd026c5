import { z } from 'zod';
import { role } from '#core/review/role.ts';
import { id, timestamp, typedLine } from './identifier.ts';

export const email = z
  .email({ error: 'must be an e-mail address' })
  .max(254, { error: 'must have at most 254 characters' })
  .transform((value) => value.toLowerCase());
/** bcrypt reads 72 bytes; a longer password would be cut silently. */
export const newPassword = z
  .string()
  .min(12, { error: 'must have at least 12 characters' })
  .refine((value) => value.isWellFormed() && encodeURIComponent(value).replace(/%[0-9A-F]{2}/g, 'x').length <= 72, {
    error: 'must have at most 72 bytes',
  });
const roles = z
  .array(role)
  .min(1, { error: 'must name at least one role' })
  .max(6)
  .refine((given) => new Set(given).size === given.length, { error: 'must not name a role twice' });
const token = z.string().min(20).max(200);

export const teamAction = z.enum(['create-assembly', 'read-audit', 'manage-members', 'read-mail']);

export const sessionView = z
  .strictObject({
    member: z.strictObject({ id, name: z.string(), email: z.string(), roles }),
    team: z.strictObject({ id, name: z.string() }),
    allowed: z.array(teamAction),
    expiresAt: timestamp,
  })
  .meta({ id: 'Session' });

export const signInBody = z.strictObject({ email, password: z.string().min(1).max(200) });
export const changePasswordBody = z.strictObject({ currentPassword: z.string().min(1).max(200), newPassword });

export const memberView = z
  .strictObject({
    id,
    name: z.string(),
    email: z.string(),
    roles,
    joinedAt: timestamp,
    removedAt: timestamp.nullable(),
  })
  .meta({ id: 'Member' });
export const changeMemberBody = z.strictObject({ name: typedLine(100).optional(), roles: roles.optional() });

export const invitationView = z
  .strictObject({
    id,
    name: z.string(),
    email: z.string(),
    roles,
    invitedBy: z.string(),
    createdAt: timestamp,
    expiresAt: timestamp,
  })
  .meta({ id: 'Invitation' });
export const inviteBody = z.strictObject({ name: typedLine(100), email, roles });
/** What a person with the link from the mail may know before they accept. */
export const invitationPreview = z.strictObject({ team: z.string(), name: z.string(), email: z.string(), roles });
export const invitationTokenBody = z.strictObject({ token });
export const acceptInvitationBody = z.strictObject({ token, name: typedLine(100), password: newPassword });

export const requestResetBody = z.strictObject({ email });
export const completeResetBody = z.strictObject({ token, password: newPassword });

export const teamView = z.strictObject({ id, name: z.string() }).meta({ id: 'Team' });
export const renameTeamBody = z.strictObject({ name: typedLine(100) });

export const mailView = z
  .strictObject({
    id: z.string(),
    to: z.string(),
    from: z.string(),
    subject: z.string(),
    text: z.string(),
    receivedAt: timestamp,
  })
  .meta({ id: 'Mail' });

export type SessionView = z.output<typeof sessionView>;
export type MemberView = z.output<typeof memberView>;
export type InvitationView = z.output<typeof invitationView>;
export type MailView = z.output<typeof mailView>;

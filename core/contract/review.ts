import { z } from 'zod';
import { id, timestamp, typedText } from './identifier.ts';

const findingReason = z.strictObject({
  rule: typedText(100),
  ref: z.string().max(80).nullable(),
  condition: z.string().max(200).nullable(),
  reason: typedText(1000),
});

export const submitBody = z.strictObject({
  reasons: z.array(findingReason).max(200),
  note: typedText(2000, 0).optional(),
});
export const reasonBody = z.strictObject({ reason: typedText(2000) });
/** A signature needs the password once more, so that an open screen cannot sign (21 CFR 11.200 asks the same of e-signatures: from memory). */
export const signBody = z.strictObject({ password: z.string().min(1).max(200) });

export const place = z.strictObject({
  kind: z.enum(['regulator', 'source', 'pour', 'via-field', 'sink', 'probe', 'condition', 'board']),
  id: z.string().max(200),
});

export const commentView = z
  .strictObject({
    id,
    author: z.string(),
    text: z.string(),
    place: place.nullable(),
    createdAt: timestamp,
    resolvedAt: timestamp.nullable(),
    resolvedBy: z.string().nullable(),
  })
  .meta({ id: 'Comment' });
export const commentBody = z.strictObject({ text: typedText(4000), place: place.nullable().default(null) });

export const auditEventView = z
  .strictObject({
    sequence: z.int(),
    at: timestamp,
    actor: z.string(),
    kind: z.string(),
    /** What it happened to, in words: "PCA-0617 revision A". */
    subject: z.string(),
    revisionId: id.nullable(),
    /** Facts frozen at the time: old and new values, reasons. */
    facts: z.record(z.string(), z.unknown()),
  })
  .meta({ id: 'AuditEvent' });

export type CommentView = z.output<typeof commentView>;
export type AuditEventView = z.output<typeof auditEventView>;

import { z } from 'zod';
import { boardDocument } from '#core/board/document.ts';
import { verdict } from '#core/result/result.ts';
import { revisionState } from '#core/review/revision-state.ts';
import { id, timestamp, typedLine } from './identifier.ts';

export const revisionAction = z.enum([
  'edit',
  'solve',
  'comment',
  'submit',
  'send-back',
  'clear',
  'issue',
  'withdraw',
  'open-next',
]);

export const revisionSummary = z
  .strictObject({
    id,
    letter: z.string(),
    state: revisionState,
    /** Of the newest result for the present sketch; null while there is none. */
    verdict: verdict.nullable(),
    changedAt: timestamp,
  })
  .meta({ id: 'RevisionSummary' });

export const assemblyView = z
  .strictObject({
    id,
    number: z.string(),
    title: z.string(),
    createdAt: timestamp,
    /** Newest first. */
    revisions: z.array(revisionSummary),
  })
  .meta({ id: 'Assembly' });

export const createAssemblyBody = z.strictObject({
  number: typedLine(40),
  title: typedLine(200),
  /** Starting sketch; a blank board when left out. */
  board: boardDocument.optional(),
});
export const changeAssemblyBody = z.strictObject({
  number: typedLine(40).optional(),
  title: typedLine(200).optional(),
});
export const openNextRevisionBody = z.strictObject({ from: id });

const person = z.strictObject({ id, name: z.string() });

export const signatureView = z.strictObject({
  name: z.string(),
  meaning: z.enum(['authored', 'reviewed', 'released']),
  signedAt: timestamp,
});

export const revisionView = z
  .strictObject({
    id,
    assembly: z.strictObject({ id, number: z.string(), title: z.string() }),
    letter: z.string(),
    state: revisionState,
    /** Of sketch and state together; goes into ETag and If-Match. */
    version: z.int(),
    authors: z.array(person),
    createdAt: timestamp,
    changedAt: timestamp,
    changedBy: z.string(),
    reasons: z.array(
      z.strictObject({
        rule: z.string(),
        ref: z.string().nullable(),
        condition: z.string().nullable(),
        reason: z.string(),
      }),
    ),
    /** Why it was sent back or withdrawn; null otherwise. */
    stateReason: z.string().nullable(),
    signatures: z.array(signatureView),
    openComments: z.int(),
    allowed: z.array(revisionAction),
  })
  .meta({ id: 'Revision' });

export const sketchView = z.strictObject({
  version: z.int(),
  savedAt: timestamp,
  savedBy: z.string(),
  board: boardDocument,
});

export const sketchVersionView = z.strictObject({ version: z.int(), savedAt: timestamp, savedBy: z.string() });

export type RevisionSummary = z.output<typeof revisionSummary>;
export type AssemblyView = z.output<typeof assemblyView>;
export type RevisionView = z.output<typeof revisionView>;
export type SketchView = z.output<typeof sketchView>;

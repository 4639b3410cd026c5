import { appendAuditEvent } from '#db/audit-events.ts';
import type { Database } from '#db/database.ts';
import { changeRevision, type Revision } from '#db/revisions.ts';
import { insertSketchVersion, lastSketchVersions } from '#db/sketch-versions.ts';
import { actOnRevision, revisionName } from '../review/act-on-revision.ts';
import { refuseStale } from '../review/refuse-stale.ts';
import type { Actor } from '../session/actor.ts';
import type { WrittenBoard } from './read-written-board.ts';

export type SavedSketch = { version: number; savedAt: Date; savedBy: string };

/** Saves a board over the version that it was made from: a new sketch version, the revision's new version, one audit event. */
export async function saveSketch(
  database: Database,
  actor: Pick<Actor, 'member' | 'team'>,
  given: { revisionId: string; overVersion: number; written: WrittenBoard },
): Promise<SavedSketch> {
  const { overVersion, written } = given;
  return actOnRevision(database, actor, given.revisionId, 'edit', async (trx, revision) => {
    const repeated = await sameSaveAgain(trx, actor, revision, given);
    if (repeated) return repeated;
    await refuseStale(trx, revision, overVersion);
    const changed = await changeRevision(trx, revision.id, overVersion, actor.member.id, { sketchHash: written.hash });
    if (!changed) throw new Error('a locked revision changed its version');
    const savedAt = await insertSketchVersion(trx, {
      revisionId: revision.id,
      version: changed.version,
      board: written.document,
      boardHash: written.hash,
      savedBy: actor.member.id,
    });
    await appendAuditEvent(trx, {
      teamId: actor.team.id,
      actor: actor.member,
      kind: 'sketch.saved',
      subject: revisionName(revision),
      revisionId: revision.id,
      facts: {
        version: { from: overVersion, to: changed.version },
        sketchHash: { from: revision.sketchHash, to: written.hash },
      },
    });
    return { version: changed.version, savedAt, savedBy: actor.member.name };
  });
}

/**
 * A save whose answer was lost comes again: the present sketch is the actor's own, has the same content and was
 * made over the same version. It is answered as the first time and stored no second time.
 */
async function sameSaveAgain(
  database: Database,
  actor: Pick<Actor, 'member'>,
  revision: Revision,
  { overVersion, written }: { overVersion: number; written: WrittenBoard },
): Promise<SavedSketch | null> {
  if (revision.version !== overVersion + 1 || revision.sketchVersion !== revision.version) return null;
  if (revision.sketchHash !== written.hash) return null;
  const [present] = await lastSketchVersions(database, revision.id);
  if (!present || present.savedById !== actor.member.id) return null;
  return { version: revision.version, savedAt: present.savedAt, savedBy: present.savedBy };
}

import type { Database } from '#db/database.ts';
import type { Revision } from '#db/revisions.ts';
import { lastSketchVersions } from '#db/sketch-versions.ts';
import { Refusal } from '../http/refusal.ts';

/** @throws Refusal 412 with who saved last and when, where the revision has moved on since `overVersion` */
export async function refuseStale(database: Database, revision: Revision, overVersion: number): Promise<void> {
  if (revision.version === overVersion) return;
  const [present] = await lastSketchVersions(database, revision.id);
  if (!present) throw new Error(`revision ${revision.id} has no sketch`);
  throw new Refusal(
    412,
    'stale-version',
    'Changed meanwhile',
    `Your version ${overVersion} is not the present one: ${revision.changedBy} changed revision ${revision.letter} meanwhile.`,
    {
      current: {
        version: revision.version,
        savedBy: present.savedBy,
        savedAt: present.savedAt.toISOString(),
      },
    },
  );
}

import type { Database } from '#db/database.ts';
import { findResult, findResultById, newestResultOf, type StoredCheck } from '#db/results.ts';
import type { Revision } from '#db/revisions.ts';
import { methodVersion as method } from '#core/thermal/method.ts';

export type CountingResult = StoredCheck & {
  sketchVersion: number;
  /** Of the present sketch by the present method, or the very result that was signed. */
  upToDate: boolean;
};

/** The result to show for a revision: the one that was signed, that of the present sketch, or the newest there is. */
export async function resultThatCounts(database: Database, revision: Revision): Promise<CountingResult | null> {
  const { id, teamId, sketchHash, sketchVersion, resultId } = revision;
  const present = resultId
    ? await findResultById(database, teamId, resultId)
    : await findResult(database, teamId, sketchHash, method);
  if (present) return { ...present, sketchVersion, upToDate: true };
  const newest = await newestResultOf(database, teamId, id);
  return newest && { ...newest, upToDate: false };
}

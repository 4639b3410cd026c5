import type { RevisionView } from '#core/contract/assemblies.ts';
import { allowedRevisionActions } from '#core/review/permissions.ts';
import { authorsOf } from '#db/authors.ts';
import { countOpenComments } from '#db/comments.ts';
import type { Database } from '#db/database.ts';
import { listReasons } from '#db/finding-reasons.ts';
import { findRevision, type Revision } from '#db/revisions.ts';
import { listSignatures } from '#db/signatures.ts';
import { notFound } from '../http/refusal.ts';
import type { Actor } from '../session/actor.ts';

/** A revision of the actor's team with everything that the actor may do to it. */
export async function presentRevision(
  database: Database,
  actor: Pick<Actor, 'member' | 'team'>,
  id: string,
): Promise<RevisionView> {
  const revision = await findRevision(database, actor.team.id, id);
  if (!revision) throw notFound('This revision');
  return presentLoaded(database, actor, revision);
}

/** The same of a revision that was just read. */
export async function presentLoaded(
  database: Database,
  actor: Pick<Actor, 'member'>,
  revision: Revision,
): Promise<RevisionView> {
  const { id } = revision;
  // One after the other: `database` may be a transaction, which is a single connection.
  const authors = await authorsOf(database, id);
  const signatures = await listSignatures(database, id, revision.sketchVersion);
  const reasons = await listReasons(database, id);
  const openComments = await countOpenComments(database, id);
  const isAuthor = authors.some((author) => author.id === actor.member.id);
  return {
    id,
    assembly: revision.assembly,
    letter: revision.letter,
    state: revision.state,
    version: revision.version,
    authors,
    createdAt: revision.createdAt.toISOString(),
    changedAt: revision.changedAt.toISOString(),
    changedBy: revision.changedBy,
    reasons,
    stateReason: revision.stateReason,
    signatures: signatures.map(({ name, meaning, signedAt }) => ({ name, meaning, signedAt: signedAt.toISOString() })),
    openComments,
    allowed: allowedRevisionActions(actor.member.roles, revision.state, isAuthor),
  };
}

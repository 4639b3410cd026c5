import type { Knex } from 'knex';
import { refusal, type RevisionAction } from '#core/review/permissions.ts';
import { authorsOf } from '#db/authors.ts';
import type { Database } from '#db/database.ts';
import { lockRevision, type Revision } from '#db/revisions.ts';
import { transaction } from '#db/transaction.ts';
import { notFound } from '../http/refusal.ts';
import type { Actor } from '../session/actor.ts';
import { refuseAct } from './refuse-act.ts';

/**
 * Runs `act` in one transaction that holds the revision, once the actor's roles, the revision's state and its
 * authorship have been looked at under that lock.
 */
export async function actOnRevision<T>(
  database: Database,
  actor: Pick<Actor, 'member' | 'team'>,
  revisionId: string,
  action: RevisionAction,
  act: (trx: Knex.Transaction, revision: Revision) => Promise<T>,
): Promise<T> {
  return transaction(database, async (trx) => {
    const revision = await lockRevision(trx, actor.team.id, revisionId);
    if (!revision) throw notFound('This revision');
    const authors = await authorsOf(trx, revisionId);
    const isAuthor = authors.some(({ id }) => id === actor.member.id);
    const refused = refusal(action, actor.member.roles, revision.state, isAuthor);
    if (refused) throw refuseAct(refused, revision);
    return act(trx, revision);
  });
}

/** How a revision is named in the audit trail, in mails and in file names. */
export function revisionName({ assembly, letter }: Pick<Revision, 'assembly' | 'letter'>): string {
  return `${assembly.number} revision ${letter}`;
}

import type { CheckResult } from '#core/result/result.ts';
import type { Database } from '#db/database.ts';
import type { Revision } from '#db/revisions.ts';
import type { Deps } from '../deps.ts';
import type { Notice } from '../mail/notice.ts';
import type { RevisionFacts } from '../mail/notices/revision-facts.ts';
import { queueMail } from '../mail/queue-mail.ts';
import type { Actor } from '../session/actor.ts';
import { revisionName } from './act-on-revision.ts';

/** Queues one notice per recipient, none for the actor and none twice. */
export async function notify(
  deps: Pick<Deps, 'newId' | 'publicUrl'>,
  database: Database,
  actor: Pick<Actor, 'member' | 'team'>,
  revision: Revision,
  recipients: readonly { id: string; name: string; email: string }[],
  result: CheckResult | null,
  write: (facts: RevisionFacts) => Notice,
): Promise<void> {
  const others = new Map(recipients.filter(({ id }) => id !== actor.member.id).map((person) => [person.id, person]));
  for (const person of others.values()) {
    const notice = write({
      recipient: person.name,
      actor: actor.member.name,
      revision: revisionName(revision),
      title: revision.assembly.title,
      result,
      page: `${deps.publicUrl}/revisions/${revision.id}`,
    });
    await queueMail(deps, database, actor.team.id, person, notice);
  }
}

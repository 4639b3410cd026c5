import type { Database } from '#db/database.ts';
import { insertMail } from '#db/mail-outbox.ts';
import type { Deps } from '../deps.ts';
import type { Notice } from './notice.ts';

/** Queues a notice within the transaction that it tells about, under a Message-ID that never changes. */
export async function queueMail(
  deps: Pick<Deps, 'newId' | 'publicUrl'>,
  database: Database,
  teamId: string,
  recipient: { email: string },
  notice: Notice,
): Promise<void> {
  const id = deps.newId();
  await insertMail(database, {
    id,
    teamId,
    messageId: `<${id}@${new URL(deps.publicUrl).hostname}>`,
    recipient: recipient.email,
    ...notice,
  });
}

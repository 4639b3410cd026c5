import type { Database } from './database.ts';

export type WaitingMail = {
  id: string;
  teamId: string;
  messageId: string;
  recipient: string;
  subject: string;
  text: string;
  /** Tries so far, this one included. */
  tries: number;
};

type Row = {
  id: string;
  team_id: string;
  message_id: string;
  recipient: string;
  subject: string;
  text: string;
  tries: number;
};

/** Queues a mail in the transaction that it tells about. */
export async function insertMail(
  database: Database,
  given: Omit<WaitingMail, 'tries'> & { holdsToken: boolean },
): Promise<void> {
  await database('mail_outbox').insert({
    id: given.id,
    team_id: given.teamId,
    message_id: given.messageId,
    recipient: given.recipient,
    subject: given.subject,
    text: given.text,
    holds_token: given.holdsToken,
  });
}

/** Takes mails that are due, for one try each; no other process gets them before the claim ends. */
export async function claimMails(database: Database, limit: number, claimSeconds: number): Promise<WaitingMail[]> {
  const { rows } = await database.raw<{ rows: Row[] }>(
    `update mail_outbox set tries = tries + 1, claimed_until = now() + make_interval(secs => :claimSeconds)
     where id in (
       select id from mail_outbox
       where sent_at is null and failed_at is null and next_try_at <= now()
         and (claimed_until is null or claimed_until < now())
       order by next_try_at limit :limit for update skip locked)
     returning id, team_id, message_id, recipient, subject, text, tries`,
    { limit, claimSeconds },
  );
  return rows.map((row) => ({
    id: row.id,
    teamId: row.team_id,
    messageId: row.message_id,
    recipient: row.recipient,
    subject: row.subject,
    text: row.text,
    tries: row.tries,
  }));
}

/** A text that lets its reader in is not kept once it is on its way. */
export async function markSent(database: Database, id: string): Promise<void> {
  await database('mail_outbox')
    .where({ id })
    .update({
      sent_at: database.fn.now(),
      claimed_until: null,
      last_error: null,
      text: database.raw("case when holds_token then '' else text end"),
    });
}

export async function postponeMail(database: Database, id: string, seconds: number, error: string): Promise<void> {
  await database('mail_outbox')
    .where({ id })
    .update({
      next_try_at: database.raw('now() + make_interval(secs => ?)', [seconds]),
      claimed_until: null,
      last_error: error,
    });
}

export async function giveUpMail(database: Database, id: string, error: string): Promise<void> {
  await database('mail_outbox')
    .where({ id })
    .update({ failed_at: database.fn.now(), claimed_until: null, last_error: error });
}

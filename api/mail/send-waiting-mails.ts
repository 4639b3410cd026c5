import type { Transporter } from 'nodemailer';
import type { Logger } from 'pino';
import { appendAuditEvent } from '#db/audit-events.ts';
import type { Database } from '#db/database.ts';
import { claimMails, giveUpMail, markSent, postponeMail, type WaitingMail } from '#db/mail-outbox.ts';
import { transaction } from '#db/transaction.ts';

const atOnce = 10;
const claimSeconds = 60;
/** Ever later, then hourly: about three days in all, so that a mail server may be away over a weekend. */
const mostTries = 84;
const longestPauseSeconds = 3600;

/**
 * Sends the mails that are due. A refusal for good (5xx) is given up visibly, everything else is tried again, ever later.
 * The Message-ID is fixed, so that a mail sent twice after a lost answer is known as one.
 * @returns how many were claimed
 */
export async function sendWaitingMails(
  database: Database,
  transport: Transporter,
  from: string,
  logger: Logger,
): Promise<number> {
  const mails = await claimMails(database, atOnce, claimSeconds);
  await Promise.all(mails.map((mail) => sendOne(database, transport, from, mail, logger)));
  return mails.length;
}

async function sendOne(database: Database, transport: Transporter, from: string, mail: WaitingMail, logger: Logger) {
  try {
    await transport.sendMail({
      from,
      to: mail.recipient,
      subject: mail.subject,
      text: mail.text,
      messageId: mail.messageId,
    });
    await markSent(database, mail.id);
  } catch (error) {
    const { message } = error as Error;
    logger.warn({ mail: mail.id, tries: mail.tries, reason: message }, 'mail not sent');
    if (isRefusedForGood(error) || mail.tries >= mostTries) await giveUp(database, mail, message);
    else await postponeMail(database, mail.id, pauseAfter(mail.tries), message);
  }
}

/** A 5xx about this recipient or this message; one about the connection or the sign-in is the operator's to mend. */
function isRefusedForGood(error: unknown): boolean {
  const { code, responseCode } = error as { code?: string; responseCode?: number };
  return (code === 'EENVELOPE' || code === 'EMESSAGE') && responseCode !== undefined && responseCode >= 500;
}

/** Seconds until the next try: doubled each time up to an hour, spread by a fifth so that a crowd does not come at once. */
function pauseAfter(tries: number): number {
  return Math.min(longestPauseSeconds, 2 ** tries) * (0.9 + Math.random() / 5);
}

async function giveUp(database: Database, mail: WaitingMail, reason: string): Promise<void> {
  await transaction(database, async (trx) => {
    await giveUpMail(trx, mail.id, reason);
    await appendAuditEvent(trx, {
      teamId: mail.teamId,
      actor: null,
      kind: 'mail.given-up',
      subject: mail.recipient,
      facts: { mail: mail.subject, tries: mail.tries, reason },
    });
  });
}

import type { Transporter } from 'nodemailer';
import type { Logger } from 'pino';
import type { Database } from '#db/database.ts';
import { claimMails, giveUpMail, markSent, postponeMail, type WaitingMail } from '#db/mail-outbox.ts';

const atOnce = 10;
const claimSeconds = 60;
const mostTries = 12;
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
    const { message, responseCode } = error as Error & { responseCode?: number };
    logger.warn({ mail: mail.id, tries: mail.tries, reason: message }, 'mail not sent');
    const isFinal = (responseCode !== undefined && responseCode >= 500) || mail.tries >= mostTries;
    if (isFinal) await giveUpMail(database, mail.id, message);
    else await postponeMail(database, mail.id, Math.min(longestPauseSeconds, 2 ** mail.tries), message);
  }
}

import { randomUUID } from 'node:crypto';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import { environmentOrExit } from './env.ts';
import { mailFolder } from './mail/mail-folder.ts';
import { whenAsked } from './when-asked.ts';

/** Local stand-in for a mail server: takes every message on the loopback interface and keeps it in a folder. */
const environment = environmentOrExit(process.env);
if (!environment.MAIL_SINK_FOLDER) {
  process.stderr.write('Setting MAIL_SINK_FOLDER must name a folder\n');
  process.exit(78);
}
const folder = mailFolder(environment.MAIL_SINK_FOLDER);

const server = new SMTPServer({
  authOptional: true,
  disabledCommands: ['STARTTLS', 'AUTH'],
  size: 1_000_000,
  onData: (stream, session, answer) => {
    keep(
      stream,
      session.envelope.rcptTo.map(({ address }) => address),
    ).then(
      () => answer(),
      (error: unknown) => answer(error instanceof Error ? error : new Error(String(error))),
    );
  },
});

async function keep(stream: NodeJS.ReadableStream, to: readonly string[]): Promise<void> {
  const mail = await simpleParser(stream as Parameters<typeof simpleParser>[0]);
  await folder.add({
    id: mail.messageId ?? randomUUID(),
    to: to.join(', '),
    from: mail.from?.text ?? '',
    subject: mail.subject ?? '',
    text: mail.text ?? '',
    receivedAt: new Date().toISOString(),
  });
}

server.on('error', (error) => {
  process.stderr.write(`The mail sink cannot listen: ${error.message}\n`);
  process.exit(1);
});
server.listen(Number(new URL(environment.SMTP_URL).port), '127.0.0.1');
whenAsked(() => new Promise((done) => server.close(() => done())));

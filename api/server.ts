import { randomUUID } from 'node:crypto';
import { existsSync } from 'node:fs';
import { createServer } from 'node:http';
import { resolve } from 'node:path';
import { pino } from 'pino';
import { openDatabase } from '#db/connection.ts';
import { createApp } from './app.ts';
import { environmentOrExit } from './env.ts';
import { mailFolder } from './mail/mail-folder.ts';
import { orEnd } from './or-end.ts';
import { passwordHasher } from './session/password-hasher.ts';
import { openCheckQueue } from './solving/check-queue.ts';
import { whenAsked } from './when-asked.ts';

/** The API and the pages on one address. */
const environment = environmentOrExit(process.env);
const logger = pino({ level: environment.LOG_LEVEL });
const database = openDatabase(environment.DATABASE_URL);
const queue = await orEnd(
  'DATABASE_URL leads to no usable database',
  openCheckQueue(environment.DATABASE_URL, logger, false),
);
const webFolder = resolve('dist/web');
const app = createApp({
  database,
  logger,
  queue,
  passwords: passwordHasher(),
  sessionSecret: environment.SESSION_SECRET,
  sessionHours: environment.SESSION_HOURS,
  publicUrl: environment.PUBLIC_URL,
  trustProxy: environment.TRUST_PROXY,
  mailFolder: environment.MAIL_SINK_FOLDER ? mailFolder(environment.MAIL_SINK_FOLDER) : null,
  webFolder: existsSync(webFolder) ? webFolder : null,
  migrationsFolder: resolve('db/migrations'),
  newId: randomUUID,
  checkAnswers: false,
});

const server = createServer(app);
server.headersTimeout = 15_000;
server.requestTimeout = 60_000;
server.on('error', (error: NodeJS.ErrnoException) => {
  process.stderr.write(
    error.code === 'EADDRINUSE' ? `PORT ${environment.PORT} is taken.\n` : `The API cannot listen: ${error.message}\n`,
  );
  process.exit(1);
});
server.listen(environment.PORT, environment.HOST, () =>
  logger.info(`listening on ${environment.HOST}:${environment.PORT}`),
);

whenAsked(async () => {
  const closed = new Promise<void>((done) => server.close(() => done()));
  server.closeIdleConnections();
  await closed;
  await queue.stop();
  await database.destroy();
});

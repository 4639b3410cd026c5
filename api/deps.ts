import type { Logger } from 'pino';
import type { Knex } from 'knex';
import type { MailFolder } from './mail/mail-folder.ts';
import type { PasswordHasher } from './session/password-hasher.ts';
import type { CheckQueue } from './solving/check-queue.ts';

/** Everything that the application takes from outside; made once at start. */
export type Deps = {
  database: Knex;
  logger: Logger;
  passwords: PasswordHasher;
  queue: CheckQueue;
  sessionSecret: string;
  sessionHours: number;
  /** Address under which people reach the service, without a slash at the end. */
  publicUrl: string;
  /** Number of proxies in front whose X-Forwarded headers count. */
  trustProxy: number;
  /** Messages of the local mail sink; null where there is none. */
  mailFolder: MailFolder | null;
  /** Folder of the built pages; null where they are served by somebody else. */
  webFolder: string | null;
  migrationsFolder: string;
  /** New row id. */
  newId: () => string;
  /** Compares every answer with its schema before it is sent; for tests. */
  checkAnswers: boolean;
};

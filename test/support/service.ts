import { randomUUID } from 'node:crypto';
import { join } from 'node:path';
import { pino } from 'pino';
import supertest from 'supertest';
import type { Role } from '#core/review/role.ts';
import { createApp } from '#api/app.ts';
import { passwordHasher } from '#api/session/password-hasher.ts';
import { performJob } from '#api/solving/perform-job.ts';
import { insertMember } from '#db/members.ts';
import { insertTeam } from '#db/teams.ts';
import type { TestDatabase } from './database.ts';

export const allRoles: readonly Role[] = [
  'layout-designer',
  'thermal-reviewer',
  'quality-engineer',
  'hardware-lead',
  'test-engineer',
  'administrator',
];
export const password = 'nine brass herons';
export const sessionSecret = 'a secret of the tests, long enough for all of them';
export const logger = pino({ level: 'silent' });
const root = join(import.meta.dirname, '../..');
/** The lowest cost that bcrypt knows: tests hash often. */
const passwords = passwordHasher(4);

export type Agent = ReturnType<typeof supertest.agent>;

/** The application on a test's database; queued jobs are kept until `runJobs`. */
export function openService(database: TestDatabase) {
  const queued: string[] = [];
  const app = createApp({
    database: database.knex,
    logger,
    passwords,
    queue: {
      send: (_trx, jobId) => {
        queued.push(jobId);
        return Promise.resolve();
      },
    },
    sessionSecret,
    sessionHours: 1,
    publicUrl: 'http://127.0.0.1',
    trustProxy: 0,
    mailFolder: null,
    webFolder: null,
    migrationsFolder: join(root, 'db/migrations'),
    newId: randomUUID,
    checkAnswers: true,
  });
  return {
    app,
    anyone: () => supertest.agent(app),
    /** Does what is queued, in the thread that the worker uses. */
    runJobs: async () => {
      const thread = new URL('../../api/solving/check-thread.js', import.meta.url);
      const deps = {
        database: database.knex,
        logger,
        newId: randomUUID,
        thread,
        limits: { seconds: 120, megabytes: 1024 },
      };
      for (const jobId of queued.splice(0)) await performJob(deps, jobId);
    },
    queued,
  };
}

export type Service = ReturnType<typeof openService>;
export type Team = { id: string; signIn: (role: Role) => Promise<Agent>; emailOf: (role: Role) => string };

/** A team with one member per role. */
export async function addTeam(service: Service, database: TestDatabase, name: string): Promise<Team> {
  const id = randomUUID();
  const emailOf = (role: Role) => `${role}@${name.toLowerCase()}.example`;
  await insertTeam(database.knex, { id, name });
  const passwordHash = await passwords.hash(password);
  for (const role of allRoles) {
    await insertMember(database.knex, {
      id: randomUUID(),
      teamId: id,
      name: role,
      email: emailOf(role),
      roles: [role],
      passwordHash,
    });
  }
  return {
    id,
    emailOf,
    signIn: async (role) => {
      const agent = service.anyone();
      await agent
        .post('/api/v1/session')
        .send({ email: emailOf(role), password })
        .expect(200);
      return agent;
    },
  };
}

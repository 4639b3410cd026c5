import { randomUUID } from 'node:crypto';
import { parseArgs } from 'node:util';
import { z } from 'zod';
import { typedText } from '#core/contract/identifier.ts';
import { email, newPassword } from '#core/contract/people.ts';
import { openDatabase } from '#db/connection.ts';
import { insertMember } from '#db/members.ts';
import { insertTeam } from '#db/teams.ts';
import { transaction } from '#db/transaction.ts';
import { passwordHasher } from '../session/password-hasher.ts';

/** First team of an installation and its administrator: the password comes from the environment, not from the command line. */
const usage =
  'Usage: TEAM_PASSWORD=… DATABASE_URL=… npm run create-team -- --team "Name" --name "Person" --email person@example.org\n';
const { values } = parseArgs({
  options: { team: { type: 'string' }, name: { type: 'string' }, email: { type: 'string' }, help: { type: 'boolean' } },
});
const given = z
  .object({ team: typedText(100), name: typedText(100), email, password: newPassword, databaseUrl: z.url() })
  .safeParse({ ...values, password: process.env.TEAM_PASSWORD, databaseUrl: process.env.DATABASE_URL });
if (values.help || !given.success) {
  const faults = given.success ? [] : given.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}\n`);
  process.stderr.write([...(values.help ? [] : faults), usage].join(''));
  process.exit(values.help ? 0 : 2);
}

const database = openDatabase(given.data.databaseUrl, 1);
try {
  await transaction(database, async (trx) => {
    const team = { id: randomUUID(), name: given.data.team };
    await insertTeam(trx, team);
    await insertMember(trx, {
      id: randomUUID(),
      teamId: team.id,
      name: given.data.name,
      email: given.data.email,
      roles: ['administrator'],
      passwordHash: await passwordHasher().hash(given.data.password),
    });
  });
  process.stdout.write(`${given.data.team} is there; ${given.data.email} can sign in and invite others.\n`);
} finally {
  await database.destroy();
}

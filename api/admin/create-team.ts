import { randomUUID } from 'node:crypto';
import { parseArgs } from 'node:util';
import { z } from 'zod';
import { typedLine } from '#core/contract/identifier.ts';
import { email, newPassword } from '#core/contract/people.ts';
import { openDatabase } from '#db/connection.ts';
import { findByEmail } from '#db/members.ts';
import { transaction } from '#db/transaction.ts';
import { passwordHasher } from '../session/password-hasher.ts';
import { createTeam } from '../team/create-team.ts';

/** First team of an installation and its administrator: the password comes from the environment, not from the command line. */
const usage =
  'Usage: TEAM_PASSWORD=… DATABASE_URL=… npm run create-team -- --team "Name" --name "Person" --email person@example.org\n';
const { values } = parseArgs({
  options: { team: { type: 'string' }, name: { type: 'string' }, email: { type: 'string' }, help: { type: 'boolean' } },
});
const given = z
  .object({ team: typedLine(100), name: typedLine(100), email, password: newPassword, databaseUrl: z.url() })
  .safeParse({ ...values, password: process.env.TEAM_PASSWORD, databaseUrl: process.env.DATABASE_URL });
if (values.help || !given.success) {
  const faults = given.success ? [] : given.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}\n`);
  process.stderr.write([...(values.help ? [] : faults), usage].join(''));
  process.exit(values.help ? 0 : 2);
}

const database = openDatabase(given.data.databaseUrl, 1);
try {
  const { team, name, email: address, password } = given.data;
  const passwordHash = await passwordHasher().hash(password);
  await transaction(database, async (trx) => {
    const taken = await findByEmail(trx, address);
    if (taken) throw new Error(`${address} signs in already; every person has one address.`);
    const administrator = { name, email: address, roles: ['administrator' as const], passwordHash };
    await createTeam({ newId: randomUUID }, trx, { name: team, members: [administrator] });
  });
  process.stdout.write(`${given.data.team} is there; ${given.data.email} can sign in and invite others.\n`);
} catch (error) {
  process.stderr.write(`No team was made: ${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
} finally {
  await database.destroy();
}

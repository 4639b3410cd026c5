import { randomUUID } from 'node:crypto';
import { environmentOrExit } from '../env.ts';
import { openDatabase } from '#db/connection.ts';
import { transaction } from '#db/transaction.ts';
import { findTeamByName } from '#db/teams.ts';
import { passwordHasher } from '../session/password-hasher.ts';
import { demoTeam, readDemo } from './demo-files.ts';
import { seedAssemblies } from './seed-assemblies.ts';
import { seedTeam } from './seed-team.ts';

/**
 * Loads the demo through the product's own commands, in one transaction; does nothing when it is there already.
 * Refused on a production database unless DEMO_SEED=yes says that this is meant.
 */
const environment = environmentOrExit(process.env);
if (environment.NODE_ENV === 'production' && process.env.DEMO_SEED !== 'yes') {
  process.stderr.write('The demo is not loaded in production; DEMO_SEED=yes does it all the same.\n');
  process.exit(1);
}
const database = openDatabase(environment.DATABASE_URL, 2);
try {
  if (!(await findTeamByName(database, demoTeam))) {
    const demo = readDemo();
    const deps = { newId: randomUUID, publicUrl: environment.PUBLIC_URL };
    await transaction(database, async (trx) => {
      const people = await seedTeam(deps, trx, passwordHasher(), demo);
      await seedAssemblies(deps, trx, people, demo);
    });
  }
} finally {
  await database.destroy();
}

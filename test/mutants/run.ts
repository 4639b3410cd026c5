import { cpSync, mkdtempSync, rmSync, symlinkSync } from 'node:fs';
import { availableParallelism, tmpdir } from 'node:os';
import { join, relative } from 'node:path';
import type { PlantedFault } from './planted-fault.ts';
import { plantedFaults } from './planted-faults.ts';
import { runTests, tryFault, type Trial } from './try-fault.ts';

/**
 * `make mutants`: plants faults one at a time in copies of the project, runs the tests that must see them, lists what was caught
 * and by which test. Ends non-zero when less than 95 % were. MUTANTS=pattern tries only those whose file or fault
 * it matches.
 */
const leastShare = 0.95;
const root = join(import.meta.dirname, '../..');
const leftOut = new Set(['node_modules', '.git', '.local', 'dist', 'coverage']);

function copyProject(): string {
  const copy = mkdtempSync(join(tmpdir(), 'dropwatt-mutants-'));
  cpSync(root, copy, { recursive: true, filter: (path) => !leftOut.has(relative(root, path).split('/')[0]!) });
  symlinkSync(join(root, 'node_modules'), join(copy, 'node_modules'));
  return copy;
}

const say = (line: string) => process.stdout.write(`${line}\n`);

async function work(copy: string, queue: PlantedFault[], done: Trial[]) {
  for (let next = queue.shift(); next; next = queue.shift()) {
    const trial = await tryFault(copy, next);
    done.push(trial);
    say(`${trial.caughtBy ? 'caught  ' : 'SURVIVED'} ${trial.file}: ${trial.fault}`);
    if (trial.caughtBy) say(`           by ${trial.caughtBy}`);
  }
}

const wanted = new RegExp(process.env.MUTANTS ?? '');
const queue = plantedFaults.filter(({ file, fault }) => wanted.test(`${file} ${fault}`));
const copies = Array.from({ length: Math.max(1, Math.min(4, availableParallelism())) }, copyProject);
try {
  // A test that is red already would catch everything.
  const sound = await runTests(
    copies[0]!,
    [...new Set(queue.flatMap(({ tests }) => tests))],
    join(copies[0]!, 'trial.json'),
  );
  if (sound !== 0) throw new Error('The tests are red without any fault planted.');
  const done: Trial[] = [];
  const waiting = [...queue];
  await Promise.all(copies.map((copy) => work(copy, waiting, done)));
  const caught = done.filter(({ caughtBy }) => caughtBy !== null).length;
  say(`\n${caught} of ${done.length} planted faults caught (${((100 * caught) / done.length).toFixed(0)} %)`);
  for (const { file, fault, caughtBy } of done) if (caughtBy === null) say(`survived: ${file}: ${fault}`);
  process.exitCode = caught >= leastShare * done.length ? 0 : 1;
} catch (error) {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
} finally {
  for (const copy of copies) rmSync(copy, { recursive: true, force: true });
}

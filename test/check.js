import { spawnSync } from 'node:child_process';
import { preparePackages } from '../api/launch/prepare.js';

/** `make check`: types, lint, format; all three are run even when the first one fails. */
await preparePackages();
const steps = [
  ['types', ['tsc', '-b']],
  ['lint', ['oxlint', '--type-aware', '--deny-warnings']],
  ['format', ['prettier', '--check', '--log-level', 'warn', '.']],
];
for (const [name, words] of steps) {
  const fine = spawnSync('npx', words, { stdio: ['ignore', 'inherit', 'inherit'] }).status === 0;
  process.stdout.write(`${String(name)}: ${fine ? 'green' : 'red'}\n`);
  if (!fine) process.exitCode = 1;
}

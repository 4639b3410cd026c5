import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ensureChromium } from './support/chromium.js';
import { ensureSciPy } from './support/scipy.js';
import { checkNode, prepareBuild, preparePackages } from '../api/launch/prepare.js';
import { ensurePostgres } from '../db/cluster/binaries.js';

/** `make test`: everything, one after the other; the last line is the sum. */
const folder = mkdtempSync(join(tmpdir(), 'dropwatt-counts-'));
const total = { passed: 0, failed: 0 };

function add({ passed, failed }) {
  total.passed += passed;
  total.failed += failed;
}

/** A step that counts as one test. */
function step(name, words) {
  process.stdout.write(`\n── ${name}\n`);
  const fine = spawnSync('npx', words, { stdio: ['ignore', 'inherit', 'inherit'] }).status === 0;
  add(fine ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 });
}

function projects(name, chosen) {
  process.stdout.write(`\n── ${name}\n`);
  const counts = join(folder, `${name}.json`);
  const words = [
    'vitest',
    'run',
    '--config',
    'test/vitest.config.ts',
    ...chosen.flatMap((project) => ['--project', project]),
  ];
  const { status } = spawnSync('npx', words, {
    stdio: ['ignore', 'inherit', 'inherit'],
    env: { ...process.env, TEST_COUNTS: counts },
  });
  try {
    const counted = JSON.parse(readFileSync(counts, 'utf8'));
    // A run that failed without a failed test (a broken set-up) must not pass.
    add(status !== 0 && counted.failed === 0 ? { ...counted, failed: 1 } : counted);
  } catch {
    add({ passed: 0, failed: 1 });
  }
}

try {
  checkNode();
  ensurePostgres();
  ensureChromium();
  ensureSciPy();
  await preparePackages();
  step('types', ['tsc', '-b']);
  step('lint', ['oxlint', '--type-aware', '--deny-warnings', '--quiet']);
  step('format', ['prettier', '--check', '--log-level', 'warn', '.']);
  projects('units and server', ['core', 'web', 'server']);
  await prepareBuild();
  projects('journey', ['journey']);
} catch (error) {
  process.stderr.write(`${error.message}\n`);
  total.failed += 1;
} finally {
  rmSync(folder, { recursive: true, force: true });
}
process.exitCode = total.failed === 0 ? 0 : 1;
process.stdout.write(`\n${total.passed} passed, ${total.failed} failed\n`);

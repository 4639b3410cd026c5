import { spawn } from 'node:child_process';
import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import type { PlantedFault } from './planted-fault.ts';

/** What became of a planted fault: the first test that turned red, or null where none did. */
export type Trial = PlantedFault & { caughtBy: string | null };

type Report = {
  testResults: { name: string; message: string; assertionResults: { status: string; fullName: string }[] }[];
};

/**
 * Plants a fault in a copy of the project, runs the tests that must see it, and takes it out again.
 * @throws Error where its text does not stand exactly once
 */
export async function tryFault(copy: string, planted: PlantedFault): Promise<Trial> {
  const path = join(copy, planted.file);
  const text = readFileSync(path, 'utf8');
  if (text.split(planted.from).length !== 2) {
    throw new Error(`${planted.file} does not hold exactly once: ${planted.from}`);
  }
  const report = join(copy, 'trial.json');
  rmSync(report, { force: true });
  writeFileSync(
    path,
    text.replace(planted.from, () => planted.to),
  );
  try {
    const status = await runTests(copy, planted.tests, report);
    return { ...planted, caughtBy: status === 0 ? null : firstFailure(copy, report) };
  } finally {
    writeFileSync(path, text);
  }
}

/** Runs tests until the first turns red; resolves to the exit status. */
export function runTests(copy: string, tests: readonly string[], report: string): Promise<number> {
  const words = ['vitest', 'run', '--config', 'test/vitest.config.ts', '--project', 'core', '--bail', '1'];
  const child = spawn('npx', [...words, '--reporter=json', `--outputFile=${report}`, ...tests], {
    cwd: copy,
    stdio: 'ignore',
  });
  return new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('exit', (code) => resolve(code ?? 1));
  });
}

function firstFailure(copy: string, report: string): string {
  const { testResults } = JSON.parse(readFileSync(report, 'utf8')) as Report;
  for (const { name, message, assertionResults } of testResults) {
    const failed = assertionResults.find(({ status }) => status === 'failed');
    const file = name.replace(`${copy}/`, '');
    if (failed) return `${file}: ${failed.fullName.trim()}`;
    if (message) return `${file}: ${message.split('\n')[0]}`;
  }
  return 'the run as a whole';
}

import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { projectFolder } from './local-folder.js';
import { runTool } from './run-tool.js';

/** Loads the demo team and its assemblies; what is there already stays. Needs the build. */
export function seedDemo(env, signal) {
  return runTool(process.execPath, ['--enable-source-maps', 'dist/api/seed-demo.js'], {
    env: { ...env, DEMO_SEED: 'yes' },
    signal,
  });
}

/** One line for each demo member, in columns. */
export function demoSignIns() {
  const signIns = JSON.parse(readFileSync(join(projectFolder, 'db/seeds/demo/sign-ins.json'), 'utf8'));
  const width = (key) => Math.max(...signIns.map((one) => one[key].length));
  return signIns.map(
    ({ email, password, role, name }) =>
      `  ${email.padEnd(width('email'))}  ${password.padEnd(width('password'))}  ${role.padEnd(width('role'))}  ${name}`,
  );
}

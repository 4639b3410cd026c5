import { setTimeout as pause } from 'node:timers/promises';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { startCluster } from '../../db/cluster/cluster.js';
import { freePort, isFree } from '../../db/cluster/ports.js';
import { clusterFolder, projectFolder } from './local-folder.js';
import { localSettings } from './local-settings.js';
import { checkNode, prepareBuild, preparePackages } from './prepare.js';
import { supervise } from './supervisor.js';

/** `make start`: everything on one address, until Ctrl-C or SIGTERM. */
const readyWithinMs = 60_000;
let stop = async () => {};
let isEnding = false;

async function end(code) {
  if (isEnding) return;
  isEnding = true;
  await stop();
  process.exit(code);
}
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
  process.on(signal, () => {
    process.stdout.write('\nEnding …\n');
    void end(0);
  });
}

async function start() {
  checkNode();
  const port = Number(process.env.PORT || 4680);
  if (!Number.isInteger(port) || port < 1 || port > 65535) {
    throw new Error(`PORT must be a whole number from 1 to 65535, found "${process.env.PORT}".`);
  }
  if (!(await isFree(port, process.env.HOST || '127.0.0.1'))) {
    throw new Error(`PORT ${port} is taken; end what uses it or set PORT to another.`);
  }
  await preparePackages();
  const cluster = await startCluster({ folder: clusterFolder });
  stop = async () => {
    if (!cluster.wasRunning) cluster.stop();
  };
  // Imported late: these need the packages that were just installed.
  const { prepareDatabase } = await import('./database.js');
  const { runTool } = await import('./run-tool.js');
  const databaseUrl = await prepareDatabase(cluster);
  await prepareBuild();
  const smtpPort = await freePort();
  const env = { ...process.env, ...localSettings({ databaseUrl, smtpPort }) };
  await runTool(process.execPath, ['--enable-source-maps', 'dist/api/seed-demo.js'], {
    env: { ...env, DEMO_SEED: 'yes' },
  });
  if (isEnding) return;

  const program = (name, file) => ({ name, words: ['--enable-source-maps', `dist/api/${file}.js`] });
  const programs = [program('API', 'server'), program('Worker', 'worker'), program('Mail sink', 'mail-sink')];
  const supervisor = supervise(programs, env, (message) => {
    process.stderr.write(`${message}\n`);
    void end(1);
  });
  stop = async () => {
    await supervisor.end();
    if (!cluster.wasRunning) cluster.stop();
  };
  await untilReady(`http://127.0.0.1:${env.PORT}/api/v1/health/ready`);
  if (!isEnding) process.stdout.write(greeting(env.PUBLIC_URL));
}

async function untilReady(url) {
  for (const began = Date.now(); Date.now() - began < readyWithinMs && !isEnding; await pause(150)) {
    try {
      if ((await fetch(url)).status === 200) return;
    } catch {
      // Not listening yet.
    }
  }
  if (!isEnding) throw new Error(`The service did not become ready within ${readyWithinMs / 1000} s.`);
}

function greeting(address) {
  const signIns = JSON.parse(readFileSync(join(projectFolder, 'db/seeds/demo/sign-ins.json'), 'utf8'));
  const width = Math.max(...signIns.map(({ email }) => email.length));
  const people = signIns.map(({ email, role, password }) => `  ${email.padEnd(width)}  ${password}  ${role}`);
  return `\nDropwatt is at ${address}\n\nDemo sign-ins:\n${people.join('\n')}\n\nMail that it sends: ${address}/mail (as the administrator)\nCtrl-C ends it.\n`;
}

start().catch((error) => {
  if (!isEnding) process.stderr.write(`${error.message}\n`);
  void end(1);
});

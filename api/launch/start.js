import { freePort, isFree } from '../../db/cluster/ports.js';
import { demoSignIns, seedDemo } from './demo.js';
import { callable, checkSettings, listenAddress, localSettings } from './local-settings.js';
import { openLocalDatabase } from './local-database.js';
import { claimStart } from './one-start.js';
import { checkNode, prepareBuild, preparePackages } from './prepare.js';
import { untilEnded } from './until-ended.js';
import { supervise } from './supervisor.js';
import { untilReady } from './until-ready.js';

/** `make start`: everything on one address, until Ctrl-C or SIGTERM. */
await untilEnded(async ({ ending, atEnd, giveUp }) => {
  checkNode();
  const { host, port } = listenAddress();
  claimStart();
  if (!(await isFree(port, host))) {
    throw new Error(`PORT ${port} is taken; end what uses it or set PORT to another.`);
  }
  await preparePackages({ signal: ending });
  await checkSettings();
  const database = await openLocalDatabase();
  atEnd(database.stop);
  await prepareBuild({ signal: ending });
  const env = localSettings({ databaseUrl: database.url, smtpPort: await freePort() });
  const program = (name, file) => ({
    name,
    words: ['--enable-source-maps', '--import', './api/launch/end-with-parent.js', `dist/api/${file}.js`],
  });
  if (database.isOwn) await seedDemo(env, ending);
  if (ending.aborted) return;

  const programs = [program('API', 'server'), program('Worker', 'worker')];
  if (!process.env.SMTP_URL) programs.push(program('Mail sink', 'mail-sink'));
  const supervisor = supervise(programs, env, giveUp);
  atEnd(supervisor.end);
  await untilReady(`http://${callable(host)}:${port}/api/v1/health/ready`, ending);
  supervisor.ready();
  if (!ending.aborted) process.stdout.write(greeting(env, database.isOwn));
});

function greeting({ PUBLIC_URL: address, MAIL_SINK_FOLDER: mail }, hasDemo) {
  return [
    '',
    `Dropwatt is at ${address}`,
    ...(hasDemo ? ['', 'Demo sign-ins:', ...demoSignIns()] : []),
    ...(mail ? ['', `Mail that it sends: ${address}/mail (as the administrator)`] : []),
    'Ctrl-C ends it.',
    '',
  ].join('\n');
}

import { freePort, isFree } from '../../db/cluster/ports.js';
import { callable, checkSettings, listenAddress, localSettings } from './local-settings.js';
import { openLocalDatabase } from './local-database.js';
import { claimStart } from './one-start.js';
import { checkNode, prepareBuild, preparePackages } from './prepare.js';
import { demoSignIns, seedDemo } from './demo.js';
import { supervise } from './supervisor.js';
import { untilEnded } from './until-ended.js';
import { untilReady } from './until-ready.js';

/** The port that web/vite.config.ts names. */
const pagesPort = 5173;
const pages = `http://127.0.0.1:${pagesPort}`;

/** `make dev`: server programs that start again when a source changes, pages that follow every change. */
await untilEnded(async ({ ending, atEnd, giveUp }) => {
  checkNode();
  const { host, port } = listenAddress();
  claimStart();
  if (!(await isFree(port, host))) throw new Error(`PORT ${port} is taken; end what uses it or set PORT to another.`);
  if (!(await isFree(pagesPort, '127.0.0.1'))) throw new Error(`Port ${pagesPort} of the pages is taken.`);
  await preparePackages({ signal: ending });
  await checkSettings();
  const database = await openLocalDatabase();
  atEnd(database.stop);
  const local = localSettings({ databaseUrl: database.url, smtpPort: await freePort() });
  const api = `http://${callable(host)}:${port}`;
  const env = {
    ...local,
    NODE_ENV: process.env.NODE_ENV || 'development',
    PUBLIC_URL: process.env.PUBLIC_URL || pages,
    API_URL: api,
  };
  if (database.isOwn) {
    await prepareBuild({ signal: ending });
    await seedDemo(env, ending);
  }
  if (ending.aborted) return;

  const node = (name, ...words) => ({ name, words: ['--import', './api/launch/end-with-parent.js', ...words] });
  const watched = (name, file) => node(name, 'node_modules/tsx/dist/cli.mjs', 'watch', '--clear-screen=false', file);
  const programs = [
    watched('API', 'api/server.ts'),
    watched('Worker', 'api/worker.ts'),
    node(
      'Pages',
      'node_modules/vite/bin/vite.js',
      '--config',
      'web/vite.config.ts',
      '--host',
      '127.0.0.1',
      '--logLevel',
      'warn',
    ),
  ];
  if (!process.env.SMTP_URL) programs.push(watched('Mail sink', 'api/mail-sink.ts'));
  const supervisor = supervise(programs, env, giveUp);
  atEnd(supervisor.end);
  await untilReady(`${api}/api/v1/health/ready`, ending);
  supervisor.ready();
  if (ending.aborted) return;
  const people = database.isOwn ? ['', 'Demo sign-ins:', ...demoSignIns()] : [];
  process.stdout.write(['', `Pages at ${pages}, API at ${api}`, ...people, 'Ctrl-C ends it.', ''].join('\n'));
});

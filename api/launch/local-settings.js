import { randomBytes } from 'node:crypto';
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { localFolder, mailFolder } from './local-folder.js';

/** Settings of a start on this machine; what the environment gives goes first. */
export function localSettings({ databaseUrl, smtpPort }) {
  const port = process.env.PORT || '4680';
  return {
    NODE_ENV: 'production',
    HOST: '127.0.0.1',
    PORT: port,
    PUBLIC_URL: `http://127.0.0.1:${port}`,
    LOG_LEVEL: 'warn',
    SMTP_URL: `smtp://127.0.0.1:${smtpPort}`,
    MAIL_FROM: 'Dropwatt <dropwatt@localhost.localdomain>',
    MAIL_SINK_FOLDER: mailFolder,
    SESSION_SECRET: sessionSecret(),
    ...given(process.env),
    DATABASE_URL: databaseUrl,
  };
}

/** An empty variable counts as not set. */
const given = (values) => Object.fromEntries(Object.entries(values).filter(([, value]) => value !== ''));

/** Made once, so that a restart ends no session. */
function sessionSecret() {
  const file = join(localFolder, 'session-secret');
  try {
    return readFileSync(file, 'utf8');
  } catch {
    const secret = randomBytes(32).toString('hex');
    mkdirSync(localFolder, { recursive: true });
    writeFileSync(file, secret, { mode: 0o600 });
    return secret;
  }
}

import { randomBytes } from 'node:crypto';
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { localFolder, mailFolder } from './local-folder.js';

const defaultPort = '4680';

/**
 * Settings of a start on this machine. What the environment gives goes first; an empty variable counts as not set.
 * @param {{ databaseUrl: string, smtpPort: number }} local used where the environment names no database and no mail server
 */
export function localSettings({ databaseUrl, smtpPort }) {
  const given = Object.fromEntries(Object.entries(process.env).filter(([, value]) => value !== ''));
  const { HOST: host = '127.0.0.1', PORT: port = defaultPort } = given;
  return {
    NODE_ENV: 'production',
    HOST: host,
    PORT: port,
    PUBLIC_URL: `http://${callable(host)}:${port}`,
    LOG_LEVEL: 'warn',
    MAIL_FROM: 'Dropwatt <dropwatt@localhost.localdomain>',
    ...(given.SMTP_URL ? {} : { SMTP_URL: `smtp://127.0.0.1:${smtpPort}`, MAIL_SINK_FOLDER: mailFolder }),
    ...(given.SESSION_SECRET ? {} : { SESSION_SECRET: sessionSecret() }),
    DATABASE_URL: databaseUrl,
    ...given,
  };
}

/** Host by which this machine reaches a listening address: 0.0.0.0 and :: stand for all of them. */
export function callable(host) {
  if (host === '0.0.0.0' || host === '::') return '127.0.0.1';
  return host.includes(':') ? `[${host}]` : host;
}

/**
 * The address to listen on, read before any package is there.
 * @throws Error when PORT is not a port
 */
export function listenAddress() {
  const port = process.env.PORT || defaultPort;
  if (!/^\d{1,5}$/.test(port) || Number(port) < 1 || Number(port) > 65_535) {
    throw new Error('Setting PORT must be a whole number from 1 to 65535');
  }
  return { host: process.env.HOST || '127.0.0.1', port: Number(port) };
}

/**
 * Reads the settings as the programs will, so that a wrong one is told before anything is set up.
 * @throws Error with one line that names the setting and the form it must have
 */
export async function checkSettings() {
  const { tsImport } = await import('tsx/esm/api');
  const { loadEnvironment } = await tsImport('../env.ts', import.meta.url);
  try {
    loadEnvironment(localSettings({ databaseUrl: 'postgres://127.0.0.1/dropwatt', smtpPort: 25 }));
  } catch (error) {
    throw new Error(`Setting ${error.message}`, { cause: error });
  }
}

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

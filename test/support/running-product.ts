import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { TestProject } from 'vitest/node';
import { freePort } from '#db/cluster/ports.js';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Address of the product as `make start` serves it. */
    address: string;
  }
}

/** The product exactly as `make start` runs it, with a cluster and settings of its own, ended by SIGTERM. */
export default async function setUp(project: TestProject) {
  const folder = mkdtempSync(join(tmpdir(), 'dropwatt-journey-'));
  const port = await freePort();
  const child = spawn(process.execPath, ['api/launch/start.js'], {
    cwd: join(import.meta.dirname, '../..'),
    env: { ...process.env, PORT: String(port), NODE_ENV: 'production', DROPWATT_LOCAL: folder },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let output = '';
  const ended = new Promise<number | null>((done) => child.once('exit', done));
  await new Promise<void>((ready, failed) => {
    const listen = (data: Buffer) => {
      output += data.toString();
      if (output.includes('Ctrl-C ends it.')) ready();
    };
    child.stdout.on('data', listen);
    child.stderr.on('data', listen);
    void ended.then((code) => failed(new Error(`The product ended with ${code}:\n${output}`)));
  });
  project.provide('address', `http://127.0.0.1:${port}`);
  return async () => {
    child.kill('SIGTERM');
    const code = await ended;
    rmSync(folder, { recursive: true, force: true });
    if (code !== 0) throw new Error(`make start ended with ${code}:\n${output}`);
  };
}

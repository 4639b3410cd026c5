import { existsSync } from 'node:fs';
import { build } from 'esbuild';

/** Programs of the server, each a file in dist/api. */
const programs = {
  server: 'api/server.ts',
  worker: 'api/worker.ts',
  'check-thread': 'api/solving/check-thread.ts',
  'mail-sink': 'api/mail-sink.ts',
  'seed-demo': 'api/seed/seed-demo.ts',
};

await build({
  entryPoints: Object.fromEntries(Object.entries(programs).filter(([, file]) => existsSync(file))),
  outdir: 'dist/api',
  bundle: true,
  platform: 'node',
  target: 'node20',
  format: 'esm',
  packages: 'external',
  splitting: true,
  sourcemap: true,
  logLevel: 'warning',
});

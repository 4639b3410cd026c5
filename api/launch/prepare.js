import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { projectFolder } from './local-folder.js';
import { runTool } from './run-tool.js';
import { whenChanged } from './stamp.js';

const at = (path) => existsSync(join(projectFolder, path));

/** Packages from the lock file, when they are not those of it already. */
export function preparePackages() {
  return whenChanged(
    'packages',
    ['package-lock.json'],
    () => at('node_modules/.package-lock.json'),
    async () => {
      process.stdout.write('Installing packages from the lock file …\n');
      await runTool('npm', ['ci', '--no-audit', '--no-fund']);
    },
  );
}

/** Server and pages, when a source has changed. */
export function prepareBuild() {
  const sources = ['web', 'api', 'core', 'db', 'package-lock.json', 'package.json'];
  return whenChanged(
    'build',
    sources,
    () => at('dist/api/server.js') && at('dist/web/index.html'),
    async () => {
      process.stdout.write('Building …\n');
      await runTool('node', ['api/build.js']);
      await runTool('npx', ['vite', 'build', '--config', 'web/vite.config.ts', '--logLevel', 'warn']);
    },
  );
}

/** @throws Error when Node is too old */
export function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major < 20 || (major === 20 && minor < 19)) {
    throw new Error(`Node ${process.versions.node} is too old; 20.19 or newer is needed.`);
  }
}

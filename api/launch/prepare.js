import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { projectFolder } from './local-folder.js';
import { runTool } from './run-tool.js';
import { whenChanged } from './stamp.js';

const at = (path) => existsSync(join(projectFolder, path));

/** Packages from the lock file, when they are not those of it already. */
export async function preparePackages({ signal } = {}) {
  if (hasPackages()) return;
  process.stdout.write('Installing packages from the lock file …\n');
  await runTool('npm', ['ci', '--no-audit', '--no-fund'], { signal });
}

/**
 * Compares the lock file with npm's own record of what it installed, which is written last and removed first, so that
 * an installation that was broken off does not count.
 */
function hasPackages() {
  if (!at('node_modules/.package-lock.json')) return false;
  const wanted = packagesOf('package-lock.json');
  const there = packagesOf('node_modules/.package-lock.json');
  return Object.entries(wanted).every(([path, { version, integrity, optional }]) => {
    const found = there[path];
    // Parts for other machines are left out.
    if (path === '' || (!found && optional)) return true;
    return found?.version === version && found.integrity === integrity;
  });
}

const packagesOf = (file) => JSON.parse(readFileSync(join(projectFolder, file), 'utf8')).packages;

/** Server and pages, when a source has changed. */
export function prepareBuild({ signal } = {}) {
  const sources = ['web', 'api', 'core', 'db', 'package-lock.json', 'package.json'];
  return whenChanged(
    'build',
    sources,
    () => at('dist/api/server.js') && at('dist/web/index.html'),
    async () => {
      process.stdout.write('Building …\n');
      await runTool('node', ['api/build.js'], { signal });
      await runTool('npx', ['vite', 'build', '--config', 'web/vite.config.ts', '--logLevel', 'warn'], { signal });
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

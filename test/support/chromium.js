import { existsSync } from 'node:fs';
import { aptInstall } from '../../db/cluster/binaries.js';

/** Debian's browser, in which the journeys are driven. */
export const chromiumPath = '/usr/bin/chromium';

/** @throws Error with one line that says what to install */
export function ensureChromium() {
  if (existsSync(chromiumPath)) return;
  if (process.getuid?.() !== 0) throw new Error('Chromium is missing. Install it first: sudo apt-get install chromium');
  process.stdout.write('Installing Chromium …\n');
  aptInstall(['chromium']);
}

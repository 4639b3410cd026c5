#!/usr/bin/env node
// The command line runs from source, so that it works on a clean clone without a build.
import { register } from 'tsx/esm/api';

register();
const { run } = await import('./run.ts');
process.exitCode = await run(process.argv.slice(2));

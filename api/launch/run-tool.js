import { spawn } from 'node:child_process';
import { projectFolder } from './local-folder.js';

/** Runs a program to its end, its output shown only when it fails. @throws Error with that output */
export function runTool(command, words, { env = process.env, show = false, signal } = {}) {
  return new Promise((done, failed) => {
    const child = spawn(command, words, {
      cwd: projectFolder,
      env,
      signal,
      stdio: ['ignore', show ? 'inherit' : 'pipe', show ? 'inherit' : 'pipe'],
    });
    let output = '';
    child.stdout?.on('data', (data) => (output += data));
    child.stderr?.on('data', (data) => (output += data));
    child.once('error', failed);
    child.once('close', (code) => {
      if (code === 0) done(output);
      else failed(new Error(`${command} ${words.join(' ')} failed (${code}):\n${output.trim()}`));
    });
  });
}

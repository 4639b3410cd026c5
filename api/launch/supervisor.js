import { spawn } from 'node:child_process';
import { projectFolder } from './local-folder.js';

const firstPauseMs = 250;
const longestPauseMs = 10_000;
const patienceMs = 10_000;
/** A wrong setting: starting again would not help (sysexits: EX_CONFIG). */
const wrongSetting = 78;

/**
 * Keeps programs running: one that ends unasked is started again, at first at once, then ever later.
 * @param {{ name: string, words: string[] }[]} programs arguments of node
 * @param {(message: string) => void} onGiveUp a program that must not be started again has ended
 */
export function supervise(programs, env, onGiveUp) {
  const running = new Map();
  let isEnding = false;

  const start = (program, pause) => {
    const began = Date.now();
    const child = spawn(process.execPath, program.words, {
      cwd: projectFolder,
      env,
      stdio: ['ignore', 'inherit', 'inherit'],
      // Ctrl-C reaches the whole terminal group; the children are told by us, once.
      detached: true,
    });
    running.set(program.name, child);
    child.once('exit', (code, signal) => {
      running.delete(program.name);
      if (isEnding) return;
      if (code === wrongSetting) return onGiveUp(`${program.name} refused its settings.`);
      const next = Date.now() - began > 30_000 ? firstPauseMs : Math.min(pause * 2, longestPauseMs);
      process.stderr.write(`${program.name} ended (${signal ?? code}); it is started again.\n`);
      setTimeout(() => {
        if (!isEnding) start(program, next);
      }, pause);
    });
  };
  for (const program of programs) start(program, firstPauseMs);

  return {
    /** Asks every program to end and waits; what has not ended after 10 s is killed. */
    end: async () => {
      isEnding = true;
      await Promise.all(
        [...running.values()].map(
          (child) =>
            new Promise((done) => {
              const timer = setTimeout(() => child.kill('SIGKILL'), patienceMs);
              child.once('exit', () => {
                clearTimeout(timer);
                done();
              });
              child.kill('SIGTERM');
            }),
        ),
      );
    },
  };
}

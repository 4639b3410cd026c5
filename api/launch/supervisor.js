import { spawn } from 'node:child_process';
import { projectFolder } from './local-folder.js';

const firstPauseMs = 250;
const longestPauseMs = 10_000;
const patienceMs = 10_000;
/** A program that ran this long has started well; its next failure counts as the first one. */
const steadyMs = 30_000;
/** A wrong setting: starting again would not help (sysexits: EX_CONFIG). */
const wrongSetting = 78;
const triesBeforeReady = 4;

/**
 * Keeps programs running: one that ends unasked is started again, at first at once, then ever later.
 * Until `ready()` was called a program may end only a few times: what never ran will not run the fifth time.
 * @param {{ name: string, command?: string, words: string[] }[]} programs without a command the words are arguments of node
 * @param {NodeJS.ProcessEnv} env
 * @param {(message: string) => void} onGiveUp a program that must not be started again has ended
 */
export function supervise(programs, env, onGiveUp) {
  /** @type {Map<string, import('node:child_process').ChildProcess>} */
  const running = new Map();
  let isEnding = false;
  let isReady = false;

  const start = (program, tries = 1) => {
    const began = Date.now();
    const child = spawn(program.command ?? process.execPath, program.words, {
      cwd: projectFolder,
      env,
      // The channel tells the program when its supervisor is gone (see end-with-parent.js).
      stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
      // Ctrl-C reaches the whole terminal group; the programs are told by us, once.
      detached: true,
    });
    running.set(program.name, child);
    const again = (reason) => {
      // A program that could not be started at all may report both an error and an exit.
      if (running.get(program.name) !== child) return;
      running.delete(program.name);
      if (isEnding) return;
      if (reason === wrongSetting) return onGiveUp(`${program.name} refused its settings.`);
      if (!isReady && tries === triesBeforeReady)
        return onGiveUp(`${program.name} ended ${tries} times in a row (${reason}); see its messages above.`);
      const count = Date.now() - began > steadyMs ? 1 : tries;
      process.stderr.write(`${program.name} ended (${reason}); it is started again.\n`);
      setTimeout(
        () => {
          if (!isEnding) start(program, count + 1);
        },
        Math.min(firstPauseMs * 2 ** (count - 1), longestPauseMs),
      );
    };
    child.once('exit', (code, signal) => again(signal ?? code));
    child.once('error', (error) => again(error.message));
  };
  for (const program of programs) start(program);

  return {
    /** From now on an end is an accident, not a failed start. */
    ready: () => {
      isReady = true;
    },
    /** Asks every program to end and waits; what has not ended after 10 s is killed. */
    end: async () => {
      isEnding = true;
      await Promise.all([...running.values()].map(ended));
    },
  };
}

/** @param {import('node:child_process').ChildProcess} child */
function ended(child) {
  return new Promise((done) => {
    if (child.exitCode !== null || child.signalCode !== null || child.pid === undefined) return done();
    const timer = setTimeout(() => child.kill('SIGKILL'), patienceMs);
    child.once('exit', () => {
      clearTimeout(timer);
      done();
    });
    child.kill('SIGTERM');
  });
}

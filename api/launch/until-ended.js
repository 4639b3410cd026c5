/**
 * Runs a start until it is told to end (Ctrl-C, SIGTERM, SIGHUP), gives up or fails; then undoes what it set up, the
 * newest first, and ends the process: with 0 when it was told to, with 1 otherwise. A failure before the end is told
 * in its own words, without a stack.
 * @param {(tools: {
 *   ending: AbortSignal,
 *   atEnd: (undo: () => unknown) => void,
 *   giveUp: (message: string) => void
 * }) => Promise<void>} work
 */
export async function untilEnded(work) {
  const ending = new AbortController();
  /** @type {(() => unknown)[]} */
  const undos = [];
  let code = 0;
  let tell = () => {};
  const told = new Promise((done) => {
    tell = () => {
      ending.abort();
      done(undefined);
    };
  });
  const giveUp = (message) => {
    if (ending.signal.aborted) return;
    process.stderr.write(`${message}\n`);
    code = 1;
    tell();
  };
  // Ctrl-C in make reaches this process twice (from the terminal and from make): the first one counts.
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, () => {
      if (!ending.signal.aborted) process.stdout.write('\nEnding …\n');
      tell();
    });
  }
  try {
    await work({ ending: ending.signal, atEnd: (undo) => undos.unshift(undo), giveUp });
  } catch (error) {
    giveUp(error.message);
  }
  // Keeps the process alive where nothing else does.
  const alive = setInterval(() => {}, 60_000);
  await told;
  clearInterval(alive);
  for (const undo of undos) await undo();
  process.exit(code);
}

const patienceMs = 9000;

/** Ends the process cleanly on SIGTERM or SIGINT, and all the same when that takes too long. */
export function whenAsked(close: () => Promise<void>): void {
  let isClosing = false;
  const end = () => {
    if (isClosing) return;
    isClosing = true;
    setTimeout(() => process.exit(1), patienceMs).unref();
    close().then(
      () => process.exit(0),
      (error: unknown) => {
        process.stderr.write(`${error instanceof Error ? error.stack : String(error)}\n`);
        process.exit(1);
      },
    );
  };
  process.on('SIGTERM', end);
  process.on('SIGINT', end);
}

/** Writes to standard output and waits for it, so that a long result is whole before the process ends. */
export function print(text: string): Promise<void> {
  return new Promise((resolve, reject) => {
    process.stdout.write(text, (error) => {
      // A reader that has seen enough (head, for one) is no fault of ours.
      if (error && (error as NodeJS.ErrnoException).code !== 'EPIPE') reject(error);
      else resolve();
    });
  });
}

export function printError(text: string): void {
  process.stderr.write(`${text}\n`);
}

import type { Logger } from 'pino';

const quietMs = 1000;

/**
 * Does something again and again, never twice at once, a pause between; a failure is logged, at most once a second, and
 * tried again.
 * @returns function that ends it and waits for what is under way
 */
export function repeat(
  name: string,
  pauseMs: number,
  logger: Logger,
  act: () => Promise<unknown>,
): () => Promise<void> {
  let isEnding = false;
  let wake = () => {};
  let lastSaid = 0;
  const run = async () => {
    while (!isEnding) {
      try {
        await act();
      } catch (error) {
        if (Date.now() - lastSaid > quietMs) logger.warn({ err: error }, name);
        lastSaid = Date.now();
      }
      if (isEnding) return;
      await new Promise<void>((next) => {
        const timer = setTimeout(next, pauseMs);
        wake = () => {
          clearTimeout(timer);
          next();
        };
      });
    }
  };
  const running = run();
  return async () => {
    isEnding = true;
    wake();
    await running;
  };
}

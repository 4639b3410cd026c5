import { isMainThread } from 'node:worker_threads';

/**
 * Loaded into every program that the supervisor starts: when the supervisor is killed, the channel to it breaks and
 * the program ends as if it had been asked to, so that nothing keeps running unseen.
 */
if (isMainThread && process.channel) {
  process.once('disconnect', () => process.kill(process.pid, 'SIGTERM'));
  process.channel.unref();
}

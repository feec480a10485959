import { isMainThread } from 'node:worker_threads';

/*
 * Loaded before one of our programs (node --import): when the parent's end of standard input closes, the parent is
 * gone, whatever way it went, and this program ends as if it had been asked to; after ten seconds it ends regardless.
 */
if (isMainThread) {
  process.stdin.resume();
  process.stdin.once('end', end);
  process.stdin.once('error', end);
  // Waiting for the parent's end is no reason to stay.
  process.stdin.unref?.();
  process.channel?.unref();
}

function end() {
  process.kill(process.pid, 'SIGTERM');
  setTimeout(() => process.exit(1), 10_000).unref();
}

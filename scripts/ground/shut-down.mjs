import { rmSync } from 'node:fs';
import { report } from './failure.mjs';

/**
 * The order in which everything ends: helpers that are only preparing, then services in the order they were started
 * (the web server before the worker that serves it), then the database, then the lock. Signals start it; it runs once.
 *
 * @param {{ codeAfterSignal?: number }} options the exit code where a signal was the reason
 */
export function shutDownInOrder({ codeAfterSignal = 0 } = {}) {
  const first = [];
  const last = [];
  const helpers = new Set();
  let ending = null;
  let exitCode = 0;
  let closing = null;

  const end = async () => {
    for (const helper of helpers) helper.kill('SIGTERM');
    for (const { name, stop } of [...first, ...last.reverse()]) {
      try {
        await stop();
      } catch (error) {
        exitCode = 1;
        report(new Error(`The ${name} did not stop cleanly.`, { cause: error }));
      }
    }
    if (closing !== null) quietly(() => console.log(closing));
    process.exit(exitCode);
  };
  const now = (code) => {
    if (code !== null && ending === null) exitCode = code;
    ending ??= end();
    return ending;
  };

  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, () => {
      if (ending === null) quietly(() => console.log('\nStopping …'));
      void now(codeAfterSignal);
    });
  }
  endWithNpm(() => void now(codeAfterSignal));
  // A closed terminal or pipe must not keep us from stopping what we started.
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {});
  process.on('uncaughtException', (error) => {
    report(error);
    void now(1);
  });

  return {
    isEnding: () => ending !== null,
    /** Begins the end; `null` keeps the exit code. Never settles before the process is gone. */
    now,
    first: (name, stop) => first.push({ name, stop }),
    /** What was begun first ends last. */
    last: (name, stop) => last.push({ name, stop }),
    /** A program that prepares something and is ended with us. */
    watchHelper(child) {
      helpers.add(child);
      child.once('close', () => helpers.delete(child));
    },
    /** Printed when all has ended, as the very last line. */
    lastWords(line) {
      closing = line;
    },
    removeFile: (file) => rmSync(file, { force: true }),
  };
}

/** Under npm, a killed npm leaves us without a parent: then we end too, since nobody could stop us any more. */
function endWithNpm(end) {
  if (!process.env.npm_lifecycle_event) return;
  const parent = process.ppid;
  setInterval(() => {
    if (process.ppid !== parent) end();
  }, 1_000).unref();
}

function quietly(act) {
  try {
    act();
  } catch {
    // Nobody is left to read it.
  }
}

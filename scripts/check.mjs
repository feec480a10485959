/*
 * `npm run --silent check < requests.ndjson > responses.ndjson`: one check a line, one answer a line, in order.
 * Lines go in small batches to one worker thread per core, so the memory used does not grow with the input.
 */
import { availableParallelism } from 'node:os';
import { CheckWorkers } from './checks/check-workers.mjs';
import { compile } from './checks/compile.mjs';
import { LineSplitter } from './checks/line-splitter.mjs';

const BATCH_LINES = 64;
const BATCH_BYTES = 256 * 1024;

const code = await compile(new URL('./checks/check-worker.ts', import.meta.url));
const workers = new CheckWorkers(availableParallelism(), code);

process.stdout.on('error', (error) => {
  // Whoever reads has seen enough (`| head`).
  if (error.code === 'EPIPE') process.exit(0);
  throw error;
});

/** Writes in order and waits while the reader of our output is slow. */
async function write(lines) {
  if (lines.length === 0) return;
  if (!process.stdout.write(`${lines.join('\n')}\n`))
    await new Promise((resolve) => process.stdout.once('drain', resolve));
}

const pending = [];

async function send(batch) {
  if (batch.length === 0) return;
  pending.push(workers.check(batch));
  if (pending.length >= 2 * workers.size + 2) await write(await pending.shift());
}

const splitter = new LineSplitter();
let batch = [];
let bytes = 0;

async function take(lines) {
  for (const line of lines) {
    batch.push(line);
    bytes += line.text === null ? 0 : line.text.length;
    if (batch.length < BATCH_LINES && bytes < BATCH_BYTES) continue;
    const full = batch;
    batch = [];
    bytes = 0;
    await send(full);
  }
}

try {
  for await (const chunk of process.stdin) await take(splitter.push(chunk));
  await take(splitter.end());
  await send(batch);
  while (pending.length > 0) await write(await pending.shift());
  await workers.close();
} catch (error) {
  console.error(`check: ${error.message}`);
  await workers.close();
  process.exitCode = 1;
}

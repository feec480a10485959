/*
 * `npm run bench:checker`: the whole equivalence corpus in a seeded shuffle, from text to verdict with evidence, nothing
 * kept from one check to the next; the same scalar pairs through other algebra systems; growth with length; memory.
 * The last line is one JSON object.
 */
import { cpus } from 'node:os';
import { Worker } from 'node:worker_threads';
import { compile } from '../../../scripts/checks/compile.mjs';

const code = await compile(new URL('./bench-thread.ts', import.meta.url));
const folder = new URL('../../corpus/equivalence/', import.meta.url).pathname;

/** Runs one task of bench-thread in a thread of its own. */
function run(task) {
  return new Promise((resolve, reject) => {
    // As scripts/checks/check-workers runs the checker.
    const resourceLimits = { maxYoungGenerationSizeMb: 64 };
    const worker = new Worker(code, { eval: true, workerData: { folder, ...task }, resourceLimits });
    worker.once('message', resolve);
    worker.once('error', reject);
  });
}

const seconds = Number(process.env.BENCH_SECONDS ?? 10);
const warmUp = Number(process.env.BENCH_WARM_UP ?? 5);

console.log(`${cpus()[0]?.model ?? 'unknown processor'}, Node ${process.version}`);
const one = await run({ task: 'throughput', seconds, warmUp });
const two = await Promise.all([
  run({ task: 'throughput', seconds, warmUp }),
  run({ task: 'throughput', seconds, warmUp }),
]);
const perSecond = (r) => r.checks / r.elapsed;
const both = perSecond(two[0]) + perSecond(two[1]);
console.log(
  `corpus: ${one.cases} checks; ${one.wrong} wrong, ${one.undecided} undecided of ${one.decidable} agrees and differs`,
);
console.log(
  `one core: ${perSecond(one).toFixed(0)} checks/s by the clock, ${(one.checks / one.cpu).toFixed(0)} a second of processor time;` +
    ` median ${(one.median * 1000).toFixed(1)} µs, p99 ${one.p99.toFixed(3)} ms`,
);
console.log(`two threads: ${both.toFixed(0)} checks/s`);

const reading = await run({ task: 'reading', seconds: Math.min(seconds, 5) });
console.log(`reading alone: mean ${reading.mean.toFixed(1)} µs, median ${reading.median.toFixed(1)} µs an answer`);

const growth = await run({ task: 'growth' });
console.log('\ncost by length of the answer');
for (const { length, microseconds } of growth)
  console.log(`${String(length).padStart(6)} characters ${microseconds.toFixed(0).padStart(8)} µs`);

if (process.env.BENCH_MEMORY !== '0') {
  const memory = await run({ task: 'memory', checks: Number(process.env.BENCH_MEMORY ?? 1_000_000) });
  const mb = (bytes) => (bytes / 2 ** 20).toFixed(0);
  console.log(`\nmemory over ${memory.checks} checks: heap ${memory.samples.map(mb).join(', ')} MB after each tenth`);
}

const pairs = await run({ task: 'pairs', count: Number(process.env.BENCH_PAIRS ?? 150) });
const rows = [
  await run({ task: 'halfmark', pairs }),
  await run({ task: 'mathjs', pairs }),
  await run({ task: 'nerdamer', pairs }),
];
const { otherSystems } = await import('./other-systems.mjs');
rows.push(...(await otherSystems(pairs)));
console.log(`\n${pairs.length} scalar pairs of the corpus, without reference functions`);
console.log('system      mean ms   ratio   wrong   undecided');
const base = rows[0].mean;
for (const row of rows) {
  if (row.missing) console.log(`${row.system.padEnd(10)} not installed`);
  else {
    const cells = [
      row.mean.toFixed(3).padStart(9),
      (row.mean / base).toFixed(0).padStart(7),
      String(row.wrong).padStart(7),
    ];
    console.log(`${row.system.padEnd(10)}${cells.join(' ')} ${String(row.undecided).padStart(11)}`);
  }
}

const figures = {
  checks_per_second_core: Math.round(perSecond(one)),
  checks_per_second_two_threads: Math.round(both),
  checks_per_processor_second: Math.round(one.checks / one.cpu),
  p99_ms: Number(one.p99.toFixed(3)),
  read_us: Number(reading.mean.toFixed(1)),
  wrong: one.wrong,
  undecided: one.undecided,
};
console.log(JSON.stringify({ bench: 'checker', figures }));

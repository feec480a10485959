import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { check } from '../../../lib/checker/index';
import { type CheckRequest, type Verdict } from '../../../lib/checker/contract';
import { Random } from '../../../lib/checker/equivalence/random';
import { read } from '../../../lib/checker/reader';

export interface Labelled extends CheckRequest {
  readonly verdict: Verdict;
  readonly allowed?: readonly Verdict[];
}

/** Every line of the corpus in a shuffle that is always the same. */
export function shuffledCorpus(folder: string): Labelled[] {
  const cases = readdirSync(folder, { recursive: true, encoding: 'utf8' })
    .filter((name) => name.endsWith('.jsonl'))
    .sort()
    .flatMap((name) => readFileSync(join(folder, name), 'utf8').split('\n'))
    .filter((line) => line.trim() !== '')
    .map((line) => JSON.parse(line) as Labelled);
  const random = new Random(20261201);
  for (let k = cases.length - 1; k > 0; k--) {
    const j = random.below(k + 1);
    [cases[k], cases[j]] = [cases[j]!, cases[k]!];
  }
  return cases;
}

const requestOf = ({ id, kind, reference, answer, symbols, options }: Labelled): CheckRequest => ({
  id,
  kind,
  reference,
  answer,
  symbols,
  options,
});

/** Checks decided in some seconds after a warm-up, whole passes over the corpus, with the time of each. */
export function throughput(folder: string, seconds: number, warmUp: number): object {
  const cases = shuffledCorpus(folder);
  const requests = cases.map(requestOf);
  let wrong = 0;
  let undecided = 0;
  let decidable = 0;
  cases.forEach((labelled, k) => {
    const outcome = check(requests[k]);
    const verdict = 'error' in outcome ? 'error' : outcome.verdict;
    const allowed: readonly string[] = labelled.allowed ?? [labelled.verdict];
    if (labelled.verdict === 'agrees' || labelled.verdict === 'differs') {
      decidable++;
      if (verdict === 'undecided') undecided++;
    }
    if (!allowed.includes(verdict) && verdict !== 'undecided') wrong++;
  });
  const warmUntil = performance.now() + 1000 * warmUp;
  while (performance.now() < warmUntil) for (const request of requests) check(request);
  const times: number[] = [];
  const started = performance.now();
  const processor = process.cpuUsage();
  let last = started;
  do {
    for (const request of requests) {
      check(request);
      const now = performance.now();
      times.push(now - last);
      last = now;
    }
  } while (last - started < 1000 * seconds);
  const { user, system } = process.cpuUsage(processor);
  const sorted = Float64Array.from(times).sort();
  return {
    cases: cases.length,
    checks: times.length,
    elapsed: (last - started) / 1000,
    cpu: (user + system) / 1e6,
    median: sorted[sorted.length >> 1],
    p99: sorted[Math.floor(sorted.length * 0.99)],
    wrong,
    undecided,
    decidable,
  };
}

/** Microseconds to read an answer of the corpus, printed back as LaTeX and as plain text. */
export function readingTime(folder: string, seconds: number): object {
  const cases = shuffledCorpus(folder);
  const times: number[] = [];
  const started = performance.now();
  while (performance.now() - started < 2000 * seconds) {
    const recording = performance.now() - started > 1000 * seconds;
    for (const { answer, kind, symbols = {}, options } of cases) {
      const before = performance.now();
      read(answer, { kind, symbols, options });
      if (recording) times.push(1000 * (performance.now() - before));
    }
  }
  const sorted = Float64Array.from(times).sort();
  const mean = times.reduce((sum, time) => sum + time, 0) / times.length;
  return { mean, median: sorted[sorted.length >> 1] };
}

/** Microseconds of a whole check of sums and products of growing length, right answers with their terms turned round. */
export function growthByLength(): object {
  const rows: { length: number; microseconds: number }[] = [];
  for (const terms of [1, 4, 16, 64, 128, 250]) {
    const parts = Array.from({ length: terms }, (_, k) => `${(k % 7) + 1}*x^${k % 5}*y`);
    const reference = parts.join('+');
    const answer = [...parts].reverse().join('+');
    const request = { id: 'g', kind: 'scalar', reference, answer, symbols: { x: 'real', y: 'real' } } as const;
    for (let k = 0; k < 50; k++) check(request);
    const started = performance.now();
    for (let k = 0; k < 100; k++) check(request);
    rows.push({ length: answer.length, microseconds: (1000 * (performance.now() - started)) / 100 });
  }
  return rows;
}

/** Heap in use after each tenth of many checks. */
export function memoryOverChecks(folder: string, checks: number): object {
  const requests = shuffledCorpus(folder).map(requestOf);
  const samples: number[] = [];
  for (let k = 1; k <= checks; k++) {
    check(requests[k % requests.length]);
    if (k % Math.ceil(checks / 10) === 0) samples.push(process.memoryUsage().heapUsed);
  }
  return { checks, samples };
}

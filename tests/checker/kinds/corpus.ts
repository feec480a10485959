import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { check } from '@/lib/checker/index';
import { type CheckRequest, type Verdict } from '@/lib/checker/contract';

/** One labelled pair of the corpus; see tests/corpus/README.md. */
export interface LabelledCheck extends CheckRequest {
  readonly verdict: Verdict;
  readonly allowed?: readonly Verdict[];
  readonly slips?: readonly string[];
  readonly slipsExactly?: readonly string[];
  readonly pair?: readonly string[];
  readonly form?: string;
  readonly why: string;
}

const root = join(import.meta.dirname, '../../corpus');

/** Files of a corpus folder, by path below tests/corpus. */
export function corpusFiles(folder: string): string[] {
  return readdirSync(join(root, folder), { recursive: true, encoding: 'utf8' })
    .filter((name) => name.endsWith('.jsonl'))
    .map((name) => join(folder, name))
    .sort();
}

export function casesOf(file: string): LabelledCheck[] {
  return readFileSync(join(root, file), 'utf8')
    .split('\n')
    .filter((line) => line.trim() !== '')
    .map((line) => JSON.parse(line) as LabelledCheck);
}

/** What a case asks and does not get; null where every obligation is met. */
export function unmet(labelled: LabelledCheck): string | null {
  const { id, kind, reference, answer, symbols, options } = labelled;
  const outcome = check({ id, kind, reference, answer, symbols, options });
  const name = `${id} (${reference} ~ ${answer})`;
  if ('error' in outcome) return `${name}: ${outcome.error}`;
  const allowed = labelled.allowed ?? [labelled.verdict];
  if (!allowed.includes(outcome.verdict)) return `${name}: ${outcome.verdict}, not ${labelled.verdict}`;
  if (labelled.form !== undefined && outcome.evidence.form !== labelled.form) {
    return `${name}: form ${outcome.evidence.form ?? 'not told'}`;
  }
  if (outcome.verdict === 'agrees') return boundProblem(name, outcome.evidence.bound);
  if (outcome.verdict !== 'differs') return null;
  const missing = (labelled.slips ?? []).filter((slip) => !outcome.slips.includes(slip));
  if (missing.length > 0) return `${name}: slips ${outcome.slips.join()} without ${missing.join()}`;
  const exactly = labelled.slipsExactly;
  if (exactly && exactly.join() !== outcome.slips.join()) return `${name}: slips ${outcome.slips.join()}`;
  const pair = labelled.pair && [...labelled.pair].sort().join('+');
  if (pair && !outcome.slips.some((slip) => slip.split('+').sort().join('+') === pair)) {
    return `${name}: slips ${outcome.slips.join()} without the pair ${pair}`;
  }
  return null;
}

function boundProblem(name: string, bound: number | undefined): string | null {
  return bound !== undefined && bound > 1e-18 ? `${name}: bound ${bound}` : null;
}

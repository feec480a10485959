import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { type AnswerKind, type ReadingContext, type Symbols } from '@/lib/checker/notation/answer-tree';

/** What every case of the notation corpora says. */
interface Case {
  readonly id: string;
  readonly kind: AnswerKind;
  readonly symbols: Symbols;
  readonly choices?: readonly string[];
  readonly text: string;
  readonly why: string;
}

/** A text that must be read, and the same in plain ASCII with every sign and bracket written out. */
export interface ValidCase extends Case {
  readonly same: string;
  readonly ambiguous?: boolean;
}

/** A text that must not be read, the reason and its place in code points. */
export interface InvalidCase extends Case {
  readonly code: string;
  readonly span: readonly [number, number];
}

/** Every line of every file of one notation corpus. */
export function loadCases<Kind extends Case>(folder: 'valid' | 'invalid'): readonly Kind[] {
  const path = join(import.meta.dirname, '../../corpus/notation', folder);
  return readdirSync(path)
    .filter((file) => file.endsWith('.jsonl'))
    .sort()
    .flatMap((file) => readFileSync(join(path, file), 'utf8').split('\n'))
    .filter((line) => line !== '')
    .map((line) => JSON.parse(line) as Kind);
}

/** What the case is read with. */
export function contextOf({ kind, symbols, choices }: Case): ReadingContext {
  return { kind, symbols, options: { choices } };
}

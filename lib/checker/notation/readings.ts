/** The other common readings of a text, and what to say about them. */
import { type Diagnostic, type Span } from '../diagnostics';
import { type AnswerTree } from './answer-tree';
import { choices } from './cursor';
import { maximumAlternatives } from './limits';
import { structureOf } from './structure';

/** One reading: what it met and where. */
export interface Reading {
  readonly tree: AnswerTree | null;
  readonly problem: Diagnostic | null;
  /** Bits of `choices` that the text met. */
  readonly met: number;
  readonly places: ReadonlyMap<number, Span> | null;
}

/**
 * The readings that differ in structure from the first and from each other, single choices before combinations, and
 * the diagnostic about the first of them.
 */
export function otherReadings(
  first: Reading,
  tree: AnswerTree,
  readAgain: (taken: number) => Reading,
): { readonly alternatives: readonly AnswerTree[]; readonly diagnostic: Diagnostic | null } {
  const known = new Set([structureOf(tree)]);
  const alternatives: AnswerTree[] = [];
  let diagnostic: Diagnostic | null = null;
  for (const taken of combinations(first.met)) {
    if (alternatives.length >= maximumAlternatives) break;
    const other = readAgain(taken).tree;
    if (other === null) continue;
    const structure = structureOf(other);
    if (known.has(structure)) continue;
    known.add(structure);
    alternatives.push(other);
    diagnostic ??= describe(taken, first.places);
  }
  return { alternatives, diagnostic };
}

/** The nonempty subsets of the bits, small ones first. */
function combinations(bits: number): number[] {
  const subsets: number[] = [];
  for (let subset = bits; subset > 0; subset = (subset - 1) & bits) subsets.push(subset);
  return subsets.sort((one, other) => sizeOf(one) - sizeOf(other) || one - other);
}

function sizeOf(bits: number): number {
  let size = 0;
  for (let rest = bits; rest > 0; rest &= rest - 1) size += 1;
  return size;
}

function describe(taken: number, places: Reading['places']): Diagnostic {
  const choice = taken & -taken;
  const span = places?.get(choice) ?? { start: 0, end: 0 };
  const { message, hint } = sentences[choice] ?? { message: 'This can be read in two ways.', hint: 'Use brackets.' };
  return { code: 'ambiguous', span, message, hint };
}

const sentences: Readonly<Record<number, { readonly message: string; readonly hint: string }>> = {
  [choices.slash]: {
    message: 'What is divided by here can be read in two ways.',
    hint: 'Write a/(b*c) or (a/b)*c.',
  },
  [choices.shortExtent]: {
    message: 'What this function is taken of can be read in two ways.',
    hint: 'Write brackets, as in sin(x).',
  },
  [choices.longExtent]: {
    message: 'What this function is taken of can be read in two ways.',
    hint: 'Write brackets, as in sin(x).',
  },
  [choices.exponent]: {
    message: 'Where this exponent ends can be read in two ways.',
    hint: 'Write brackets, as in e^(i*x).',
  },
  [choices.operatorExponent]: {
    message: 'Where this exponent ends can be read in two ways.',
    hint: 'Write brackets, as in exp(-i*x*σ_z).',
  },
  [choices.split]: {
    message: 'These letters can be read as different products.',
    hint: 'Write * between the names.',
  },
};

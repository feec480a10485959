import { simplify } from 'mathjs';
import nerdamer from 'nerdamer';
import 'nerdamer/Algebra.js';
import 'nerdamer/Calculus.js';
import { printText } from '../../../lib/checker/algebra/print-text';
import { check } from '../../../lib/checker/index';
import { type SymbolTable, type Verdict } from '../../../lib/checker/contract';
import { parse } from '../../../lib/checker/notation/parse';
import { type Expression } from '../../../lib/checker/notation/tree';
import { type Labelled, shuffledCorpus } from './own-figures';

/** A scalar pair in the plain text that every system reads, with its label. */
export interface ScalarPair {
  readonly left: string;
  readonly right: string;
  readonly symbols: SymbolTable;
  readonly verdict: Verdict;
}

export interface Row {
  readonly system: string;
  readonly mean: number;
  readonly wrong: number;
  readonly undecided: number;
}

/** The first pairs of the shuffle that hold plain real symbols and no operators, states or reference functions. */
export function scalarPairs(folder: string, count: number): ScalarPair[] {
  const pairs: ScalarPair[] = [];
  for (const labelled of shuffledCorpus(folder)) {
    const pair = pairOf(labelled);
    if (pair) pairs.push(pair);
    if (pairs.length === count) break;
  }
  return pairs;
}

function pairOf({ kind, verdict, reference, answer, symbols = {}, options }: Labelled): ScalarPair | null {
  if (kind !== 'scalar' || options || (verdict !== 'agrees' && verdict !== 'differs')) return null;
  if (Object.values(symbols).some((domain) => domain === 'complex' || domain === 'integer')) return null;
  const [left, right] = [reference, answer].map((text) => {
    const { tree, ambiguous } = parse(text, { kind, symbols });
    return tree && !ambiguous ? plainText(tree as Expression) : null;
  });
  return left && right ? { left, right, symbols, verdict } : null;
}

/** Text without operators, states and functions that only some systems know; null where there are any. */
function plainText(tree: Expression): string | null {
  const text = printText(tree);
  return /sigma_|S_|[|<>[\]{}]|dagger|atan2|sec|csc|cot|Re\(|Im\(|conj/.test(text)
    ? null
    : text.replaceAll(/\bln\(/g, 'log(');
}

function measure(system: string, pairs: readonly ScalarPair[], equal: (pair: ScalarPair) => boolean | null): Row {
  let wrong = 0;
  let undecided = 0;
  const started = performance.now();
  for (const pair of pairs) {
    let verdict: boolean | null;
    try {
      verdict = equal(pair);
    } catch {
      verdict = null;
    }
    if (verdict === null) undecided++;
    else if (verdict !== (pair.verdict === 'agrees')) wrong++;
  }
  return { system, mean: (performance.now() - started) / pairs.length, wrong, undecided };
}

export function decideWithHalfmark(pairs: readonly ScalarPair[]): Row {
  const equal = ({ left, right, symbols }: ScalarPair): boolean | null => {
    const outcome = check({ id: 'p', kind: 'scalar', reference: left, answer: right, symbols });
    if ('error' in outcome || (outcome.verdict !== 'agrees' && outcome.verdict !== 'differs')) return null;
    return outcome.verdict === 'agrees';
  };
  for (let k = 0; k < 20; k++) pairs.forEach(equal);
  return measure('halfmark', pairs, equal);
}

/** mathjs simplifies the difference: equal where that is 0. It has no answer “undecided”. */
export function decideWithMathjs(pairs: readonly ScalarPair[]): Row {
  return measure('mathjs', pairs, ({ left, right }) => simplify(`(${left}) - (${right})`).toString() === '0');
}

/** nerdamer expands the difference: equal where that is 0. */
export function decideWithNerdamer(pairs: readonly ScalarPair[]): Row {
  return measure('nerdamer', pairs, ({ left, right }) => {
    const difference = nerdamer(`simplify((${left}) - (${right}))`);
    return difference.toString() === '0';
  });
}

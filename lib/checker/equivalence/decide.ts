import { type Graph, type Node, Op } from '../algebra/graph';
import { nodesUnder } from '../algebra/rebuild';
import { highPrecisionDifference, type PreciseSides } from './high-precision';
import { type ModularOutcome, modularTest } from './modular';
import { NumericPoint } from './numeric';
import { type Proof } from './proof';
import { type SamplePoints } from './sample-points';
import { sameOnEverySign } from './sign-cases';
import { ERROR_BOUND, type Pair } from './size-bound';
import { sameByExponential } from './exponential-test';

/**
 * Whether two sides are the same at every point of the domain where both are defined. `equal` rests on an exact
 * argument, `different` on a witness point; everything else is undecided.
 */
export type Decision =
  | {
      readonly status: 'equal';
      readonly test: 'normal form' | 'modular' | 'modular and numeric';
      readonly proof: Proof;
    }
  | {
      readonly status: 'different';
      readonly point: NumericPoint;
      readonly pair: number;
      readonly precise: PreciseSides | null;
    }
  | { readonly status: 'undecided'; readonly reason: string };

const NO_POINT = 'no point was found at which both sides are defined';
const FIRST_POINTS = 2;
const SEARCH_POINTS = 48;
/** Points at which branches are told apart: so many that no piece of the domain is likely to be missed. */
const BRANCH_POINTS = 240;
/** A difference this many times its error bound is beyond rounding. */
const MARGIN = 4;

/**
 * First whatever a witness in doubles shows, then the exact test, then, where both leave it open, the exponentials of the
 * two sides, and at last a witness in many figures.
 */
export function decideEqual(g: Graph, pairs: readonly Pair[], points: SamplePoints, seed: number): Decision {
  const decision = decideDirectly(g, pairs, points, seed);
  if (decision.status !== 'undecided') return decision;
  const open = pairs.filter(([x, y]) => x !== y);
  const decide = (others: readonly Pair[]): Decision => decideDirectly(g, others, points, seed);
  const proof = sameByExponential(g, open, points, decide) ?? sameOnEverySign(g, open, decide);
  if (proof && proof.bound <= ERROR_BOUND) return { status: 'equal', test: 'modular and numeric', proof };
  return preciseWitness(g, pairs, open, points) ?? decision;
}

function decideDirectly(g: Graph, pairs: readonly Pair[], points: SamplePoints, seed: number): Decision {
  const open = pairs.filter(([x, y]) => x !== y);
  if (open.length === 0) {
    return { status: 'equal', test: 'normal form', proof: { bound: 0, fields: 0, degree: 0, branches: 1, points: 0 } };
  }
  const search = new Search(pairs, points);
  const early = search.upTo(FIRST_POINTS, 8);
  if (early) return early;
  const outcome = modularTest(g, open, seed);
  if (outcome.status === 'zero') {
    const late = search.usable === 0 ? search.upTo(1, SEARCH_POINTS) : null;
    if (late) return late;
    if (search.usable === 0) return { status: 'undecided', reason: NO_POINT };
    return { status: 'equal', test: 'modular', proof: { ...proofOf(outcome), points: search.usable } };
  }
  // A constant has the same value at every point.
  const constant = isConstant(g, open);
  const many = constant ? 1 : outcome.status === 'branches' ? BRANCH_POINTS : SEARCH_POINTS;
  const found = search.upTo(many, many);
  if (found) return found;
  if (outcome.status === 'branches') return settleBranches(open, outcome, points, search.usable, many);
  const reason =
    outcome.status === 'failed' ? outcome.reason : 'the exact test and the numeric values do not settle it';
  return { status: 'undecided', reason };
}

/** A witness that only many figures show. */
function preciseWitness(g: Graph, all: readonly Pair[], pairs: readonly Pair[], points: SamplePoints): Decision | null {
  const enough = isConstant(g, pairs) ? 1 : 2;
  for (let k = 0, tried = 0; k < SEARCH_POINTS && tried < enough; k++) {
    const point = points.at(k);
    if (!point) continue;
    tried++;
    for (const [x, y] of pairs) {
      const precise = highPrecisionDifference(point, x, y);
      if (precise) return { status: 'different', point, pair: all.findIndex((p) => p[0] === x && p[1] === y), precise };
    }
  }
  return null;
}

const isConstant = (g: Graph, pairs: readonly Pair[]): boolean =>
  nodesUnder(g, pairs.flat()).every((node) => g.op[node] !== Op.Symbol);

const proofOf = (o: Extract<ModularOutcome, { bound: number }>): Omit<Proof, 'points'> => ({
  bound: o.bound,
  fields: o.fields,
  degree: o.degree,
  branches: o.status === 'zero' ? o.branches : 2 ** o.kernels.length,
});

/** Looks for a point at which a pair differs beyond rounding, remembering how far it has looked. */
class Search {
  private next = 0;
  usable = 0;

  constructor(
    private readonly pairs: readonly Pair[],
    private readonly points: SamplePoints,
  ) {}

  /** Looks until `wanted` usable points were seen or `limit` were drawn. */
  upTo(wanted: number, limit: number): Extract<Decision, { status: 'different' }> | null {
    for (; this.next < limit && this.usable < wanted; this.next++) {
      const point = this.points.at(this.next);
      if (!point) continue;
      const pair = differingPair(this.pairs, point);
      if (pair === 'unknown') continue;
      this.usable++;
      if (pair !== null) return { status: 'different', point, pair, precise: null };
    }
    return null;
  }
}

/** The first pair that differs beyond rounding at a point; null if none; `unknown` where a value is not defined there. */
export function differingPair(pairs: readonly Pair[], point: NumericPoint): number | null | 'unknown' {
  let last = 0;
  for (const [x, y] of pairs) last = Math.max(last, x, y);
  point.evaluate(last);
  for (const [x, y] of pairs) if (!point.isKnown(x) || !point.isKnown(y)) return 'unknown';
  for (let k = 0; k < pairs.length; k++) {
    const [x, y] = pairs[k]!;
    if (x !== y && differsAt(point, x, y)) return k;
  }
  return null;
}

export function differsAt(point: NumericPoint, x: Node, y: Node): boolean {
  const distance = Math.abs(point.re[x]! - point.re[y]!) + Math.abs(point.im[x]! - point.im[y]!);
  return distance > MARGIN * (point.error[x]! + point.error[y]!);
}

/**
 * The two sides agree on some branches of the roots. At each point the branches that vanish there are counted: where
 * they are as many as vanish identically, they are those, and the principal branch must be one of them.
 */
function settleBranches(
  pairs: readonly Pair[],
  outcome: Extract<ModularOutcome, { status: 'branches' }>,
  points: SamplePoints,
  usable: number,
  many: number,
): Decision {
  let settled = 0;
  const patterns = 2 ** outcome.kernels.length;
  const flips = Array.from({ length: patterns }, (_, p) => new Set(outcome.kernels.filter((_, j) => (p >> j) & 1)));
  let branch: NumericPoint | null = null;
  for (let k = 0; k < many; k++) {
    const point = points.at(k);
    if (!point) continue;
    const principal = differingPair(pairs, point);
    if (principal === 'unknown') continue;
    branch ??= new NumericPoint(point.graph, point.values);
    let vanishing = 0;
    let clear = true;
    for (let pattern = 0; pattern < patterns && clear; pattern++) {
      branch.moveTo(point, flips[pattern]!);
      const differs = differingPair(pairs, branch);
      if (differs === 'unknown') clear = false;
      else if (differs === null) vanishing++;
    }
    if (clear && vanishing === outcome.vanishing) settled++;
  }
  if (settled >= many / 3) {
    return { status: 'equal', test: 'modular and numeric', proof: { ...proofOf(outcome), points: usable } };
  }
  return { status: 'undecided', reason: 'the branches of the roots could not be told apart' };
}

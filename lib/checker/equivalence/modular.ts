import { type Graph, type Node, Op } from '../algebra/graph';
import { FieldEvaluation } from './field-evaluation';
import { type Plan, planFor } from './plan';
import { FIELD_COUNT, primeField } from './prime-field';
import { Random } from './random';
import { fieldsNeeded, type Pair, sizeBound } from './size-bound';

/**
 * Outcome of the exact test of "the two sides of every pair are the same function".
 * `zero`: yes, whatever the branch of every root. `branches`: only on `vanishing` of the `of` branches of `kernels`.
 * `nonzero`: on none. `failed`: not decided, with the reason.
 */
export type ModularOutcome =
  | {
      readonly status: 'zero';
      readonly fields: number;
      readonly degree: number;
      readonly bound: number;
      readonly branches: number;
    }
  | {
      readonly status: 'branches';
      readonly vanishing: number;
      readonly kernels: readonly Node[];
      readonly fields: number;
      readonly degree: number;
      readonly bound: number;
    }
  | { readonly status: 'nonzero' }
  | { readonly status: 'failed'; readonly reason: string };

const MOST_BRANCHES = 64;
const ATTEMPTS = 80;

interface Draw {
  readonly field: number;
  readonly seed: number;
}

/**
 * Tests by evaluation at random points of several prime fields. Independent kernels stand for variables, π, exponentials
 * and logarithms; a root takes a value whose power is the radicand. A root whose radicand was seen to be no power at
 * some point is a true extension of the field, in which one branch decides; of every other root all branches are tried.
 */
export function modularTest(g: Graph, pairs: readonly Pair[], seed: number): ModularOutcome {
  const plan = planFor(g, pairs.flat());
  const size = sizeBound(g, plan, pairs);
  const choices = plan.choices.reduce((n, order) => n * order, 1);
  const need = fieldsNeeded(size, pairs.length * choices);
  if (need.fields > FIELD_COUNT - 4)
    return { status: 'failed', reason: 'the expressions are too large for the exact test' };
  const random = new Random(seed ^ 0x5bd1e995);
  const proven = new Set<Node>();
  const draws: Draw[] = [];
  const values = new FieldEvaluation(g, plan);
  let firstZero = true;
  for (let field = 0; field < FIELD_COUNT && draws.length < need.fields; field++) {
    const drawn = drawPoint(values, field, random, proven);
    if (drawn === null) continue;
    draws.push(drawn);
    if (!values.allEqual(pairs)) {
      firstZero = false;
      break;
    }
  }
  const kernels = branching(g, plan, proven);
  if (draws.length < need.fields && firstZero)
    return { status: 'failed', reason: 'no suitable points of the prime fields' };
  if (kernels.length === 0 && choices === 1) {
    return firstZero
      ? { status: 'zero', fields: draws.length, degree: need.degree, bound: need.bound, branches: 1 }
      : { status: 'nonzero' };
  }
  if (2 ** kernels.length * choices > MOST_BRANCHES) return { status: 'failed', reason: 'too many branches of roots' };
  const each = fieldsNeeded(size, pairs.length * choices * 2 ** kernels.length);
  return overBranches(g, plan, values, pairs, draws, kernels, each, random, proven);
}

/** One point of the field at which everything is defined and has its roots; null where none is found. */
function drawPoint(values: FieldEvaluation, field: number, random: Random, proven: Set<Node>): Draw | null {
  for (let attempt = 0; attempt < ATTEMPTS; attempt++) {
    const draw = { field, seed: random.next() };
    const outcome = values.evaluate(primeField(field), draw.seed, NO_FLIPS, 0);
    if (outcome === 'ok') return draw;
    if (outcome === 'constant') return null;
    if (outcome !== 'undefined') proven.add(outcome);
  }
  return null;
}

const NO_FLIPS: ReadonlySet<Node> = new Set();

/** Roots and absolute values of functions whose branches are not known to be one orbit. */
function branching(g: Graph, plan: Plan, proven: ReadonlySet<Node>): Node[] {
  const result: Node[] = [];
  for (const node of plan.nodes) {
    const a = g.a[node]!;
    if (g.op[node] === Op.Abs) result.push(node);
    else if (g.op[node] === Op.Root && !proven.has(node)) {
      if (g.op[a] === Op.Number) continue;
      if (g.op[a] === Op.Symbol && plan.variableDegrees.has(g.a[a]!)) continue;
      result.push(node);
    }
  }
  return result;
}

function overBranches(
  g: Graph,
  plan: Plan,
  values: FieldEvaluation,
  pairs: readonly Pair[],
  draws: Draw[],
  kernels: readonly Node[],
  need: { fields: number; bound: number; degree: number },
  random: Random,
  proven: Set<Node>,
): ModularOutcome {
  const choices = plan.choices.reduce((n, order) => n * order, 1);
  const signs = 2 ** kernels.length;
  if (kernels.some((node) => g.op[node] === Op.Root && g.b[node] !== 2)) {
    return { status: 'failed', reason: 'a higher root whose branches are not independent' };
  }
  for (let field = draws.length; field < FIELD_COUNT && draws.length < need.fields; field++) {
    const drawn = drawPoint(values, field, random, proven);
    if (drawn) draws.push(drawn);
  }
  if (draws.length < need.fields) return { status: 'failed', reason: 'no suitable points of the prime fields' };
  // The number of vanishing sign patterns is the same in every field; the labels of the patterns are not.
  let vanishing = -1;
  for (const draw of draws) {
    let here = 0;
    for (let pattern = 0; pattern < signs; pattern++) {
      const flips = new Set(kernels.filter((_, k) => (pattern >> k) & 1));
      let zero = true;
      for (let choice = 0; choice < choices && zero; choice++) {
        const outcome = values.evaluate(primeField(draw.field), draw.seed, flips, choice);
        if (outcome !== 'ok') return { status: 'failed', reason: 'a branch is not defined' };
        zero = values.allEqual(pairs);
      }
      if (zero) here++;
    }
    vanishing = vanishing < 0 ? here : Math.min(vanishing, here);
    if (vanishing === 0) return { status: 'nonzero' };
  }
  const common = { fields: draws.length, degree: need.degree, bound: need.bound };
  if (vanishing === signs) return { status: 'zero', branches: signs * choices, ...common };
  return { status: 'branches', vanishing, kernels, ...common };
}

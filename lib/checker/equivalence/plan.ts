import { type Graph, type Node, Op } from '../algebra/graph';
import { monomialNode, normalForm } from '../algebra/normal-form';
import { type Monomial } from '../algebra/polynomial';
import { equalRational, negateRational, ONE, type Rational } from '../algebra/rational';
import { ROOT_ORDER } from './prime-field';

/** What one monomial of an exponent contributes: kernel^power, a fixed root of unity, or a root of a node's value. */
export type Contribution =
  | { readonly type: 'kernel'; readonly kernel: number; readonly power: number }
  | { readonly type: 'unity'; readonly power: number }
  | { readonly type: 'parity'; readonly choice: number; readonly power: number }
  | { readonly type: 'value'; readonly node: Node; readonly degree: number; readonly power: number };

/**
 * How the functions of a set of nodes are to be evaluated in a prime field: which nodes are needed, and every
 * exponential as integer powers of independent kernels e^{M/D}.
 */
export interface Plan {
  /** Needed nodes in ascending order; children first. */
  readonly nodes: Int32Array;
  readonly exponents: ReadonlyMap<Node, readonly Contribution[]>;
  /** Denominators of the kernels, by kernel. */
  readonly kernelCount: number;
  /** Order of the group from which each parity factor e^{iπn/D} takes all its values. */
  readonly choices: readonly number[];
  /** Variable index → D where the variable is the D-th power of what is drawn. */
  readonly variableDegrees: ReadonlyMap<number, number>;
  /** Least common order of the roots of unity that occur, 1 if none. */
  readonly unityOrder: number;
}

interface Piece {
  readonly node: Node;
  readonly monomial: Monomial;
  readonly coefficient: Rational;
  /** Where the monomial is one logarithm: the node it is the logarithm of, if evaluated before the exponential. */
  readonly logarithmOf: Node | null;
}

export function planFor(g: Graph, targets: readonly Node[]): Plan {
  const exponents = new Map<Node, Piece[]>();
  const needed = markNeeded(g, targets, exponents);
  const variableDegrees = new Map<number, number>();
  for (let k = 0; k < needed.length; k++) {
    const node = needed[k]!;
    const base = g.a[node]!;
    if (g.op[node] !== Op.Root || g.op[base] !== Op.Symbol || g.solved.has(g.a[base]!)) continue;
    variableDegrees.set(g.a[base]!, leastCommonMultiple(variableDegrees.get(g.a[base]!) ?? 1, g.b[node]!));
  }
  if (exponents.size === 0) {
    return { nodes: needed, exponents: NOTHING, kernelCount: 0, choices: [], variableDegrees, unityOrder: 1 };
  }
  return { nodes: needed, variableDegrees, ...kernelsOf(g, exponents) };
}

const NOTHING: ReadonlyMap<Node, readonly Contribution[]> = new Map();

/** Marks what the targets rest on; the arguments of exponentials are replaced by their monomials. */
function markNeeded(g: Graph, targets: readonly Node[], exponents: Map<Node, Piece[]>): Int32Array {
  let size = g.size;
  let marks = new Uint8Array(size + 256);
  let last = 0;
  for (const target of targets) {
    marks[target] = 1;
    if (target > last) last = target;
  }
  let count = 0;
  const need = (node: Node): void => {
    marks[node] = 1;
  };
  for (let node = last; node >= 0; node--) {
    if (marks[node] === 0) continue;
    count++;
    const a = g.a[node]!;
    switch (g.op[node]) {
      case Op.Add:
      case Op.Multiply:
        need(a);
        need(g.b[node]!);
        break;
      case Op.Power:
      case Op.Root:
      case Op.Abs:
      case Op.Ln:
        need(a);
        break;
      case Op.Exp:
      case Op.Sin:
      case Op.Cos: {
        const pieces = piecesOf(g, node);
        exponents.set(node, pieces);
        if (g.size > size) {
          const larger = new Uint8Array(g.size + 256);
          larger.set(marks);
          marks = larger;
          size = g.size;
        }
        for (const { logarithmOf } of pieces) if (logarithmOf !== null) need(logarithmOf);
        break;
      }
      case Op.Symbol: {
        const solution = g.solved.get(a);
        if (solution !== undefined) need(solution);
        break;
      }
      default:
    }
  }
  const nodes = new Int32Array(count);
  let k = 0;
  for (let node = 0; node <= last; node++) if (marks[node] === 1) nodes[k++] = node;
  return nodes;
}

/** The exponent of an exponential (of a sine or cosine, i times its argument) as a sum of monomials. */
function piecesOf(g: Graph, node: Node): Piece[] {
  const argument = g.a[node]!;
  const trigonometric = g.op[node] !== Op.Exp;
  const form = normalForm(g, argument);
  if (!form) return [{ node: argument, monomial: [], coefficient: ONE, logarithmOf: null }];
  const pieces: Piece[] = [];
  for (const term of form.values()) {
    const monomial = trigonometric ? timesI(g, term.monomial) : { monomial: term.monomial, negative: false };
    const coefficient = monomial.negative ? negateRational(term.coefficient) : term.coefficient;
    const [only] = monomial.monomial;
    const logarithm = monomial.monomial.length === 1 && only && g.op[only.atom] === Op.Ln ? g.a[only.atom]! : node;
    pieces.push({
      node: monomialNode(g, monomial.monomial),
      monomial: monomial.monomial,
      coefficient,
      logarithmOf: logarithm < node ? logarithm : null,
    });
  }
  return pieces;
}

function timesI(g: Graph, monomial: Monomial): { monomial: Monomial; negative: boolean } {
  const rest = monomial.filter(({ atom }) => atom !== g.i);
  if (rest.length < monomial.length) return { monomial: rest, negative: true };
  return {
    monomial: [...rest, { atom: g.i, exponent: ONE }].sort((x, y) => x.atom - y.atom),
    negative: false,
  };
}

function kernelsOf(
  g: Graph,
  exponents: ReadonlyMap<Node, readonly Piece[]>,
): Pick<Plan, 'exponents' | 'kernelCount' | 'choices' | 'unityOrder'> {
  const denominators = new Map<Node, number>();
  for (const pieces of exponents.values()) {
    for (const { node, coefficient } of pieces) {
      const d = coefficient.big || coefficient.d > 1e6 ? 1 : coefficient.d;
      denominators.set(node, leastCommonMultiple(denominators.get(node) ?? 1, d));
    }
  }
  const kernels = new Map<Node, number>();
  const choiceOf = new Map<Node, number>();
  const choices: number[] = [];
  let kernelCount = 0;
  let unityOrder = 1;
  const contribute = ({ node, monomial, coefficient, logarithmOf }: Piece): Contribution => {
    const denominator = denominators.get(node) ?? 1;
    const power = coefficient.big ? NaN : (coefficient.n * denominator) / coefficient.d;
    if (logarithmOf !== null && Number.isSafeInteger(power)) {
      return { type: 'value', node: logarithmOf, degree: denominator, power };
    }
    if (isHalfTurn(g, monomial, 0) && ROOT_ORDER % (2 * denominator) === 0 && Number.isSafeInteger(power)) {
      unityOrder = leastCommonMultiple(unityOrder, 2 * denominator);
      return { type: 'unity', power: (ROOT_ORDER / 2 / denominator) * power };
    }
    if (isHalfTurn(g, monomial, 1) && ROOT_ORDER % (2 * denominator) === 0 && Number.isSafeInteger(power)) {
      let choice = choiceOf.get(node);
      if (choice === undefined) {
        choice = choices.push(2 * denominator) - 1;
        choiceOf.set(node, choice);
        unityOrder = leastCommonMultiple(unityOrder, 2 * denominator);
      }
      return { type: 'parity', choice, power };
    }
    let kernel = kernels.get(node);
    if (kernel === undefined) {
      kernel = kernelCount++;
      kernels.set(node, kernel);
    }
    if (!Number.isSafeInteger(power) || Math.abs(power) > 1e7) {
      // A coefficient beyond the common denominator: a kernel of its own.
      return { type: 'kernel', kernel: kernelCount++, power: 1 };
    }
    return { type: 'kernel', kernel, power };
  };
  const result = new Map<Node, readonly Contribution[]>();
  for (const [node, pieces] of exponents) result.set(node, pieces.map(contribute));
  return { exponents: result, kernelCount, choices, unityOrder };
}

/** Whether a monomial is iπ (`integers` 0) or iπ times that many integer variables. */
function isHalfTurn(g: Graph, monomial: Monomial, integers: number): boolean {
  if (monomial.length !== 2 + integers) return false;
  let found = 0;
  for (const { atom, exponent } of monomial) {
    if (!equalRational(exponent, ONE)) return false;
    if (g.op[atom] === Op.Symbol) {
      if (g.variables[g.a[atom]!]!.domain !== 'integer') return false;
      found++;
    } else if (atom !== g.i && g.op[atom] !== Op.Pi) return false;
  }
  return found === integers;
}

export function leastCommonMultiple(a: number, b: number): number {
  let x = a;
  let y = b;
  while (y !== 0) [x, y] = [y, x % y];
  return (a / x) * b;
}

import { type Graph, type Node, Op } from '../algebra/graph';
import { type Contribution, type Plan } from './plan';
import { type PrimeField, ROOT_ORDER } from './prime-field';
import { Random } from './random';
import { type Pair } from './size-bound';

/**
 * What came of an evaluation: `ok`; `undefined` where a denominator or logarithm met zero; `constant` where the field
 * lacks a root of a number; or the root whose radicand is no power at this point.
 */
export type FieldOutcome = 'ok' | 'undefined' | 'constant' | Node;

interface Kernel {
  readonly degree: number;
  readonly radicand: number;
  readonly value: number;
}

/** Residues of the planned nodes at one point of one prime field. */
export class FieldEvaluation {
  private readonly residues: Float64Array;
  private readonly variables: Float64Array;
  private readonly kernels: Float64Array;
  private parity: number[] = [];
  private roots: Kernel[] = [];

  constructor(
    private readonly g: Graph,
    private readonly plan: Plan,
  ) {
    const last = plan.nodes[plan.nodes.length - 1] ?? 0;
    this.residues = g.buffer(last + 1);
    this.variables = new Float64Array(g.variables.length);
    this.kernels = new Float64Array(plan.kernelCount);
  }

  /** Whether the two sides of every pair have the same residue. */
  allEqual(pairs: readonly Pair[]): boolean {
    for (const [x, y] of pairs) if (this.residues[x] !== this.residues[y]) return false;
    return true;
  }

  /** The point is fixed by the seed; `flips` turns the sign of roots, `choice` picks the residues of (−1)ⁿ and the like. */
  evaluate(f: PrimeField, seed: number, flips: ReadonlySet<Node>, choice: number): FieldOutcome {
    const { g, plan } = this;
    const random = new Random(seed);
    const draw = (): number => 1 + Math.floor(random.unit() * (f.p - 1));
    for (let k = 0; k < this.variables.length; k++) this.variables[k] = draw();
    for (let k = 0; k < this.kernels.length; k++) this.kernels[k] = draw();
    const piResidue = draw();
    this.parity = [];
    let rest = choice;
    for (const order of plan.choices) {
      this.parity.push(f.power(f.zeta, (ROOT_ORDER / order) * (rest % order)));
      rest = Math.floor(rest / order);
    }
    this.roots = [];
    g.spend(plan.nodes.length * 4);
    const r = this.residues;
    for (let k = 0; k < plan.nodes.length; k++) {
      const node = plan.nodes[k]!;
      const a = g.a[node]!;
      switch (g.op[node]) {
        case Op.Number: {
          const value = g.valueOf(node);
          if (!value.big) {
            const n = f.fromInteger(value.n);
            if (value.d === 1) r[node] = n;
            else {
              const d = f.fromInteger(value.d);
              if (d === 0) return 'constant';
              r[node] = f.multiply(n, f.invert(d));
            }
          } else {
            const d = f.fromBigInt(value.d);
            if (d === 0) return 'constant';
            r[node] = f.multiply(f.fromBigInt(value.n), f.invert(d));
          }
          break;
        }
        case Op.Symbol: {
          const solution = g.solved.get(a);
          if (solution !== undefined) r[node] = r[solution]!;
          else r[node] = this.variableValue(f, a);
          break;
        }
        case Op.I:
          r[node] = f.i;
          break;
        case Op.Pi:
          r[node] = piResidue;
          break;
        case Op.Add:
          r[node] = f.add(r[a]!, r[g.b[node]!]!);
          break;
        case Op.Multiply:
          r[node] = f.multiply(r[a]!, r[g.b[node]!]!);
          break;
        case Op.Power: {
          const n = g.b[node]!;
          if (n < 0 && r[a] === 0) return 'undefined';
          r[node] = f.power(r[a]!, n);
          break;
        }
        case Op.Root: {
          const value = this.root(f, a, g.b[node]!, flips.has(node));
          if (value === null) return g.op[a] === Op.Number ? 'constant' : node;
          r[node] = value;
          break;
        }
        case Op.Abs: {
          const square = f.multiply(r[a]!, r[a]!);
          r[node] = this.linked(f, 2, square, r[a]!, flips.has(node));
          break;
        }
        case Op.Ln:
          if (r[a] === 0) return 'undefined';
          r[node] = this.linked(f, 0, r[a]!, draw(), false);
          break;
        case Op.Exp:
        case Op.Sin:
        case Op.Cos: {
          const value = this.exponential(f, plan.exponents.get(node) ?? []);
          if (typeof value !== 'number') return value.failed;
          if (g.op[node] === Op.Exp) r[node] = value;
          else {
            const inverse = f.invert(value);
            const half = (f.p + 1) / 2;
            if (g.op[node] === Op.Cos) r[node] = f.multiply(half, f.add(value, inverse));
            else r[node] = f.multiply(f.negate(f.i), f.multiply(half, f.add(value, f.negate(inverse))));
          }
          break;
        }
        default:
          return 'undefined';
      }
    }
    return 'ok';
  }

  private variableValue(f: PrimeField, index: number): number {
    const degree = this.plan.variableDegrees.get(index);
    const drawn = this.variables[index]!;
    return degree === undefined ? drawn : f.power(drawn, degree);
  }

  private root(f: PrimeField, a: Node, q: number, flip: boolean): number | null {
    const { g } = this;
    if (g.op[a] === Op.Number) {
      const value = g.valueOf(a);
      if (!value.big && value.d === 1 && value.n > 0) return f.rootOfInteger(value.n, q);
    }
    if (g.op[a] === Op.Symbol && !g.solved.has(g.a[a]!)) {
      const degree = this.plan.variableDegrees.get(g.a[a]!);
      if (degree !== undefined) return f.power(this.variables[g.a[a]!]!, degree / q);
    }
    const radicand = this.residues[a]!;
    for (const known of this.roots) {
      if (known.degree === q && known.radicand === radicand) return flip ? f.negate(known.value) : known.value;
    }
    const value = f.root(radicand, q);
    if (value === null) return null;
    this.roots.push({ degree: q, radicand, value });
    return flip ? f.negate(value) : value;
  }

  /** A value shared by every function with the same argument; degree 0 is the logarithm. */
  private linked(f: PrimeField, degree: number, argument: number, fresh: number, flip: boolean): number {
    const known = this.roots.find((k) => k.degree === degree && k.radicand === argument);
    const value = known?.value ?? fresh;
    if (!known) this.roots.push({ degree, radicand: argument, value });
    return flip ? f.negate(value) : value;
  }

  private exponential(f: PrimeField, parts: readonly Contribution[]): number | { readonly failed: FieldOutcome } {
    let value = 1;
    for (const part of parts) {
      switch (part.type) {
        case 'kernel':
          value = f.multiply(value, f.power(this.kernels[part.kernel]!, part.power));
          break;
        case 'unity':
          value = f.multiply(value, f.power(f.zeta, ((part.power % ROOT_ORDER) + ROOT_ORDER) % ROOT_ORDER));
          break;
        case 'parity':
          value = f.multiply(value, f.power(this.parity[part.choice]!, part.power));
          break;
        case 'value': {
          const base = this.residues[part.node]!;
          if (base === 0) return { failed: 'undefined' };
          const root = this.root(f, part.node, part.degree, false);
          if (root === null) return { failed: part.node };
          value = f.multiply(value, f.power(root, part.power));
          break;
        }
      }
    }
    return value;
  }
}

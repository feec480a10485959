import { type Graph, type Node, Op } from '../algebra/graph';
import { bitLength } from '../algebra/rational';
import { type Plan } from './plan';
import { LEAST_PRIME } from './prime-field';

/** Two nodes that are to be compared. */
export type Pair = readonly [Node, Node];

/** Degree of the numerator of a difference, bits of the 1-norm of its coefficients, degree of its constant field. */
export interface SizeBound {
  readonly degree: number;
  readonly bits: number;
  readonly constants: number;
  /** Roots over variables: a drawn point lies on the variety with at least half of the points for each. */
  readonly roots: number;
}

/**
 * Bounds the numerator N of each difference N/D as a polynomial in the variables, kernels and roots: its total degree, and
 * log₂ of the sum of absolute values of its integer coefficients (which is submultiplicative).
 */
export function sizeBound(g: Graph, plan: Plan, pairs: readonly Pair[]): SizeBound {
  const count = plan.nodes.length;
  const place = new Int32Array((plan.nodes[count - 1] ?? 0) + 1);
  const degreeN = g.buffer(count).fill(0, 0, count);
  const degreeD = g.buffer(count).fill(0, 0, count);
  const bitsN = g.buffer(count).fill(0, 0, count);
  const bitsD = g.buffer(count).fill(0, 0, count);
  let constants = 1;
  let roots = 0;
  for (let k = 0; k < count; k++) {
    const node = plan.nodes[k]!;
    place[node] = k;
    const a = g.a[node]!;
    const x = place[a] ?? 0;
    switch (g.op[node]) {
      case Op.Number: {
        const value = g.valueOf(node);
        bitsN[k] = value.big ? bitLength(value) : Math.log2(Math.max(1, Math.abs(value.n)));
        bitsD[k] = value.big ? bitLength(value) : Math.log2(value.d);
        break;
      }
      case Op.Symbol: {
        const solution = g.solved.get(a);
        const from = solution === undefined ? -1 : place[solution]!;
        degreeN[k] = from < 0 ? (plan.variableDegrees.get(a) ?? 1) : degreeN[from]!;
        degreeD[k] = from < 0 ? 0 : degreeD[from]!;
        bitsN[k] = from < 0 ? 0 : bitsN[from]!;
        bitsD[k] = from < 0 ? 0 : bitsD[from]!;
        break;
      }
      case Op.I:
        constants *= 2;
        break;
      case Op.Pi:
        degreeN[k] = 1;
        break;
      case Op.Add: {
        const y = place[g.b[node]!]!;
        degreeN[k] = Math.max(degreeN[x]! + degreeD[y]!, degreeN[y]! + degreeD[x]!);
        degreeD[k] = degreeD[x]! + degreeD[y]!;
        bitsN[k] = Math.max(bitsN[x]! + bitsD[y]!, bitsN[y]! + bitsD[x]!) + 1;
        bitsD[k] = bitsD[x]! + bitsD[y]!;
        break;
      }
      case Op.Multiply: {
        const y = place[g.b[node]!]!;
        degreeN[k] = degreeN[x]! + degreeN[y]!;
        degreeD[k] = degreeD[x]! + degreeD[y]!;
        bitsN[k] = bitsN[x]! + bitsN[y]!;
        bitsD[k] = bitsD[x]! + bitsD[y]!;
        break;
      }
      case Op.Power: {
        const n = g.b[node]!;
        const size = Math.abs(n);
        degreeN[k] = size * (n < 0 ? degreeD[x]! : degreeN[x]!);
        degreeD[k] = size * (n < 0 ? degreeN[x]! : degreeD[x]!);
        bitsN[k] = size * (n < 0 ? bitsD[x]! : bitsN[x]!);
        bitsD[k] = size * (n < 0 ? bitsN[x]! : bitsD[x]!);
        break;
      }
      case Op.Root: {
        // (N/D)^{1/q} = (N·D^{q−1})^{1/q}/D.
        const q = g.b[node]!;
        degreeN[k] = (degreeN[x]! + (q - 1) * degreeD[x]!) / q;
        degreeD[k] = degreeD[x]!;
        bitsN[k] = (bitsN[x]! + (q - 1) * bitsD[x]!) / q;
        bitsD[k] = bitsD[x]!;
        if (g.op[a] === Op.Symbol && plan.variableDegrees.has(g.a[a]!)) break;
        if (degreeN[x]! + degreeD[x]! === 0) constants *= q;
        else roots += Math.log2(q);
        break;
      }
      case Op.Exp:
      case Op.Sin:
      case Op.Cos: {
        let up = 0;
        let down = 0;
        for (const part of plan.exponents.get(node) ?? []) {
          if (part.type === 'unity' || part.type === 'parity') continue;
          const weight =
            part.type === 'value' ? (degreeN[place[part.node]!]! + degreeD[place[part.node]!]!) / part.degree : 1;
          if (part.type === 'value' && part.degree > 1) roots += Math.log2(part.degree);
          if (part.power > 0) up += weight * part.power;
          else down -= weight * part.power;
        }
        const exponential = g.op[node] === Op.Exp;
        degreeN[k] = exponential ? up : 2 * Math.max(up, down);
        degreeD[k] = exponential ? down : up + down;
        bitsN[k] = exponential ? 0 : 1;
        bitsD[k] = exponential ? 0 : 1;
        break;
      }
      case Op.Abs:
        degreeN[k] = degreeN[x]!;
        degreeD[k] = degreeD[x]!;
        bitsN[k] = bitsN[x]!;
        bitsD[k] = bitsD[x]!;
        roots += 1;
        break;
      default:
        degreeN[k] = 1;
    }
  }
  let degree = 0;
  let bits = 0;
  for (const [x, y] of pairs) {
    const i = place[x]!;
    const j = place[y]!;
    degree = Math.max(degree, degreeN[i]! + degreeD[j]!, degreeN[j]! + degreeD[i]!);
    bits = Math.max(bits, 1 + Math.max(bitsN[i]! + bitsD[j]!, bitsN[j]! + bitsD[i]!));
  }
  return { degree: Math.ceil(degree), bits, constants: constants * Math.max(1, plan.unityOrder), roots };
}

/** Largest probability of a false zero that a check may run with. */
export const ERROR_BOUND = 1e-18;

/**
 * Number of fields needed, and the bound reached. By Schwartz (1980) and Zippel (1979) a non-zero polynomial of degree d
 * vanishes at a uniform point of F_p with probability at most d/p. Roots are taken at points where the radicand has
 * one: the norm has 2^r times the degree, and the points are at least a 2^r-th of all. At most
 * bits·constants / log₂ p primes can divide all coefficients, by the norm of any one of them; so many fields are added.
 */
export function fieldsNeeded(size: SizeBound, targets: number): { fields: number; bound: number; degree: number } {
  const degree = Math.max(1, size.degree) * 4 ** size.roots;
  const single = degree / LEAST_PRIME;
  const blind = Math.floor((size.bits * size.constants) / Math.log2(LEAST_PRIME));
  if (!(single < 0.01)) return { fields: Infinity, bound: 1, degree };
  const sure = Math.max(1, Math.ceil(Math.log(ERROR_BOUND / targets) / Math.log(single)));
  return { fields: sure + blind, bound: targets * single ** sure, degree };
}

import { type Graph, type Node, Op, Flag } from '../algebra/graph';
import { isInteger, toNumber } from '../algebra/rational';

/** Unit roundoff with room for the library's elementary functions, which are within a few units in the last place. */
const U = 2.3e-16;
/** More than what underflow takes from a product, a power or an exponential. */
const TINY = 1e-305;
/** The inverse of more than this is not told from zero. */
const HUGE = 1e300;
/** Room for nodes that are built after a point: then it need not be enlarged. */
const SPARE_NODES = 128;

/**
 * Values of a graph's nodes at one point in complex doubles, each with a bound on its absolute error by running error
 * analysis (Wilkinson 1963; Higham 2002, §3.3). NaN where a node is undefined or its value cannot be trusted.
 */
export class NumericPoint {
  re: Float64Array<ArrayBuffer>;
  im: Float64Array<ArrayBuffer>;
  error: Float64Array<ArrayBuffer>;
  private done = 0;
  /** Roots and absolute values whose sign is turned, to look at other branches; null for the principal ones. */
  flipped: ReadonlySet<Node> | null = null;

  constructor(
    readonly graph: Graph,
    /** Value of each variable, by index; the sign of one that an assumption determines up to its sign. */
    public values: Float64Array,
  ) {
    const size = graph.size + SPARE_NODES;
    this.re = graph.buffer(size);
    this.im = graph.buffer(size);
    this.error = graph.buffer(size);
  }

  /** Makes this the same point as another, on other branches, to be evaluated anew. */
  moveTo(point: NumericPoint, flipped: ReadonlySet<Node>): void {
    this.values = point.values;
    this.flipped = flipped;
    this.done = 0;
  }

  /** Evaluates every node up to and including `last`. */
  evaluate(last: Node): void {
    const g = this.graph;
    if (last < this.done) return;
    if (last >= this.re.length) this.enlarge(g.op.length);
    g.spend(2 * (last + 1 - this.done));
    for (let node = this.done; node <= last; node++) this.step(node);
    this.done = last + 1;
  }

  /** Whether the value is a usable number. */
  isKnown(node: Node): boolean {
    return this.error[node]! < 1e200 && Number.isFinite(this.re[node]!) && Number.isFinite(this.im[node]!);
  }

  private step(node: Node): void {
    const g = this.graph;
    const a = g.a[node]!;
    switch (g.op[node]) {
      case Op.Number: {
        const value = g.valueOf(node);
        const re = toNumber(value);
        this.set(node, re, 0, !value.big && isInteger(value) ? 0 : U * Math.abs(re));
        return;
      }
      case Op.Symbol: {
        const solution = g.solved.get(a);
        if (solution === undefined) this.set(node, this.values[a]!, 0, 0);
        else this.set(node, this.values[a]! * this.re[solution]!, 0, this.error[solution]!);
        return;
      }
      case Op.I:
        this.set(node, 0, 1, 0);
        return;
      case Op.Pi:
        this.set(node, Math.PI, 0, 1.3e-16);
        return;
      case Op.Add: {
        const b = g.b[node]!;
        const re = this.re[a]! + this.re[b]!;
        const im = this.im[a]! + this.im[b]!;
        this.set(node, re, im, this.error[a]! + this.error[b]! + U * (Math.abs(re) + Math.abs(im)));
        break;
      }
      case Op.Multiply:
        this.product(node, a, g.b[node]!);
        break;
      case Op.Power:
        this.power(node, a, g.b[node]!);
        break;
      case Op.Root:
        this.root(node, a, g.b[node]!);
        if (this.flipped?.has(node)) this.turn(node);
        return;
      case Op.Exp: {
        const size = Math.exp(this.re[a]!);
        const error = this.error[a]!;
        const y = this.im[a]!;
        const re = y === 0 ? size : size * Math.cos(y);
        this.set(node, re, y === 0 ? 0 : size * Math.sin(y), size * (growth(error) + 4 * U) + TINY);
        break;
      }
      case Op.Ln: {
        const x = this.re[a]!;
        const y = this.im[a]!;
        const size = modulus(x, y);
        const error = this.error[a]!;
        const trusted = error < size / 4 && (y === 0 || x > 0 || Math.abs(y) > error || g.has(a, Flag.Real));
        const re = Math.log(size);
        const im = y === 0 ? (x < 0 ? Math.PI : 0) : Math.atan2(y, x);
        this.set(node, re, im, trusted ? (1.4 * error) / size + 3 * U * (1 + Math.abs(re)) : NaN);
        break;
      }
      case Op.Sin:
      case Op.Cos: {
        const x = this.re[a]!;
        const y = this.im[a]!;
        const sine = g.op[node] === Op.Sin;
        const bound = Math.cosh(y) * (growth(this.error[a]!) + 4 * U);
        if (y === 0) this.set(node, sine ? Math.sin(x) : Math.cos(x), 0, bound);
        else if (sine) this.set(node, Math.sin(x) * Math.cosh(y), Math.cos(x) * Math.sinh(y), bound);
        else this.set(node, Math.cos(x) * Math.cosh(y), -Math.sin(x) * Math.sinh(y), bound);
        break;
      }
      case Op.Abs:
        this.set(node, Math.abs(this.re[a]!), 0, this.error[a]!);
        if (this.flipped?.has(node)) this.turn(node);
        return;
      default:
        this.set(node, NaN, NaN, NaN);
    }
    // A real value keeps no imaginary rounding, so that roots and logarithms stay on the right side of their cuts.
    const flags = g.flags[node]!;
    if (flags & Flag.Real) this.im[node] = 0;
    else if (flags & Flag.Imaginary) this.re[node] = 0;
  }

  private set(node: Node, re: number, im: number, error: number): void {
    this.re[node] = re;
    this.im[node] = im;
    this.error[node] = error;
  }

  private turn(node: Node): void {
    this.re[node] = -this.re[node]!;
    this.im[node] = -this.im[node]!;
  }

  private product(node: Node, a: Node, b: Node): void {
    const ar = this.re[a]!;
    const ai = this.im[a]!;
    const br = this.re[b]!;
    const bi = this.im[b]!;
    const ea = this.error[a]!;
    const eb = this.error[b]!;
    if (ai === 0 && bi === 0) {
      const re = ar * br;
      this.set(node, re, 0, Math.abs(ar) * eb + Math.abs(br) * ea + ea * eb + U * Math.abs(re) + TINY);
      return;
    }
    const sizeA = Math.abs(ar) + Math.abs(ai);
    const sizeB = Math.abs(br) + Math.abs(bi);
    const error = sizeA * eb + sizeB * ea + ea * eb + 2 * U * sizeA * sizeB + TINY;
    this.set(node, ar * br - ai * bi, ar * bi + ai * br, error);
  }

  private power(node: Node, a: Node, n: number): void {
    let re = this.re[a]!;
    let im = this.im[a]!;
    let error = this.error[a]!;
    if (n < 0) {
      const size = modulus(re, im);
      if (!(size > 2 * error) || size > HUGE) {
        this.set(node, NaN, NaN, NaN);
        return;
      }
      re = re / size / size;
      im = -im / size / size;
      error = error / (size * (size - error)) + (4 * U) / size;
      n = -n;
    }
    const size = modulus(re, im);
    const relative = error / size;
    let pr = 1;
    let pi = 0;
    for (let k = n, br = re, bi = im; ;) {
      if (k & 1) {
        const next = pr * br - pi * bi;
        pi = pr * bi + pi * br;
        pr = next;
      }
      k >>>= 1;
      if (k === 0) break;
      const next = br * br - bi * bi;
      bi = 2 * br * bi;
      br = next;
    }
    const bound = size === 0 ? error ** n : size ** n * (Math.expm1(n * Math.log1p(relative)) + 3 * n * U);
    this.set(node, pr, pi, bound + TINY);
  }

  private root(node: Node, a: Node, q: number): void {
    const x = this.re[a]!;
    const y = this.im[a]!;
    const size = modulus(x, y);
    const error = this.error[a]!;
    if (size <= 4 * error) {
      // Near zero the root's error is that of the radicand to the power 1/q.
      this.set(node, 0, 0, size === 0 && error === 0 ? 0 : (size + error) ** (1 / q));
      return;
    }
    const onCut = y !== 0 && x < 0 && Math.abs(y) <= error && !this.graph.has(a, Flag.Real);
    const scale = q === 2 ? Math.sqrt(size) : size ** (1 / q);
    const bound = onCut ? NaN : scale * ((1.2 * error) / (q * (size - error)) + 4 * U);
    if (y === 0 && x > 0) this.set(node, scale, 0, bound);
    else if (y === 0 && q === 2) this.set(node, 0, scale, bound);
    else {
      const angle = (y === 0 ? Math.PI : Math.atan2(y, x)) / q;
      this.set(node, scale * Math.cos(angle), scale * Math.sin(angle), bound);
    }
  }

  private enlarge(size: number): void {
    const grow = (from: Float64Array): Float64Array<ArrayBuffer> => {
      const into = this.graph.buffer(size);
      into.set(from);
      return into;
    };
    this.re = grow(this.re);
    this.im = grow(this.im);
    this.error = grow(this.error);
  }
}

/** √(x² + y²) without overflow or underflow on the way. */
function modulus(x: number, y: number): number {
  if (y === 0) return Math.abs(x);
  const size = Math.sqrt(x * x + y * y);
  return size > 1e-150 && size < 1e150 ? size : Math.hypot(x, y);
}

/** e^x − 1 for a small bound, huge for a large one. */
const growth = (error: number): number => (error < 1 ? 1.72 * error : Infinity);

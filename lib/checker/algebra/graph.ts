import { QuietError } from './quiet-error';
import { isNegative, isZero, ONE, rational, type Rational, ZERO } from './rational';

/**
 * The scalar expressions of one check, as a directed acyclic graph with shared nodes: equal construction gives the same
 * node, and children always precede their parents, so that any evaluation is one pass over arrays.
 */
export const Op = {
  Number: 0,
  Symbol: 1,
  I: 2,
  Pi: 3,
  Add: 4,
  Multiply: 5,
  /** a to the integer power b. */
  Power: 6,
  /** Principal b-th root of a. */
  Root: 7,
  Exp: 8,
  Ln: 9,
  Sin: 10,
  Cos: 11,
  /** Absolute value of a real a. */
  Abs: 12,
} as const;

/** Index of a node in its graph. */
export type Node = number;

/** What is known of a node's value everywhere in the domain. */
export const Flag = { Real: 1, NonNegative: 2, NonPositive: 4, NonZero: 8, Imaginary: 16 } as const;

export const POSITIVE = Flag.Real | Flag.NonNegative | Flag.NonZero;

/** A real variable; a complex symbol is a pair of them. */
export interface Variable {
  /** Declared name, or null for ħ. */
  readonly name: string;
  readonly part: 'whole' | 'real' | 'imaginary';
  readonly domain: 'real' | 'positive' | 'nonnegative' | 'nonzero' | 'integer' | 'between';
  /** Ends of an interval. */
  readonly low: number;
  readonly high: number;
}

/** Thrown when the work limit of a check is reached; caught at the checker's door. */
export class BudgetExceeded extends QuietError {}

/** Steps allowed for one check: about 50 ms on the machine the limit was set on. */
export const DEFAULT_BUDGET = 2_000_000;

const MAXIMUM_NODES = 60_000;

export class Graph {
  op: Uint8Array<ArrayBuffer> = new Uint8Array(1024);
  a: Int32Array<ArrayBuffer> = new Int32Array(1024);
  b: Int32Array<ArrayBuffer> = new Int32Array(1024);
  flags: Uint8Array<ArrayBuffer> = new Uint8Array(1024);
  size = 0;
  readonly numbers: Rational[] = [];
  readonly variables: Variable[] = [];
  /** Constraint variables: value given by a node instead of drawn (see assumptions). */
  readonly solved = new Map<number, Node>();
  /** Variables whose square a constraint gives (index → node of the square), for normal forms. */
  readonly squares = new Map<number, Node>();
  /** Normal forms by node, kept by normal-form.ts. */
  readonly memo = new Map<Node, object | null>();
  stepsLeft = DEFAULT_BUDGET;

  private table = new Int32Array(2048);
  private readonly numberNodes = new Map<string, Node>();

  readonly zero: Node;
  readonly one: Node;
  readonly i: Node;
  private readonly buffers: Float64Array<ArrayBuffer>[] = [];
  private buffersUsed = 0;

  /** An empty graph; its storage may have served an earlier check. */
  static acquire(): Graph {
    const graph = spare ?? new Graph();
    spare = null;
    return graph;
  }

  /** Empties a graph that is no longer needed and keeps its storage for the next check. */
  static release(graph: Graph): void {
    if (graph.size > RETAINED_NODES) return;
    if (graph.buffers.length > RETAINED_BUFFERS) graph.buffers.length = RETAINED_BUFFERS;
    graph.clear();
    spare = graph;
  }

  private constructor() {
    this.zero = this.number(ZERO);
    this.one = this.number(ONE);
    this.i = this.node(Op.I, 0, 0, Flag.Imaginary | Flag.NonZero);
  }

  /** Scratch numbers, at least `size` of them, of any content; they belong to the caller until the graph is released. */
  buffer(size: number): Float64Array<ArrayBuffer> {
    const known = this.buffers[this.buffersUsed];
    if (known && known.length >= size) {
      this.buffersUsed++;
      return known;
    }
    const fresh = new Float64Array(Math.max(256, size));
    this.buffers[this.buffersUsed++] = fresh;
    return fresh;
  }

  private clear(): void {
    this.size = 0;
    this.numbers.length = 0;
    this.variables.length = 0;
    this.solved.clear();
    this.squares.clear();
    this.memo.clear();
    this.numberNodes.clear();
    this.smallNodes.length = 0;
    this.table.fill(0);
    this.buffersUsed = 0;
    this.stepsLeft = DEFAULT_BUDGET;
    // The three constants are the first nodes of every graph, so their fields keep their values.
    this.number(ZERO);
    this.number(ONE);
    this.node(Op.I, 0, 0, Flag.Imaginary | Flag.NonZero);
  }

  /** Takes `steps` from the work limit. */
  spend(steps: number): void {
    this.stepsLeft -= steps;
    if (this.stepsLeft < 0) throw new BudgetExceeded('work limit');
  }

  number(value: Rational): Node {
    if (!value.big && value.d === 1 && value.n >= -8 && value.n <= 8) return this.smallNumber(value.n, value);
    const key = `${value.n}/${value.d}`;
    const known = this.numberNodes.get(key);
    if (known !== undefined) return known;
    const node = this.addNumber(value);
    this.numberNodes.set(key, node);
    return node;
  }

  integer(n: number): Node {
    return this.number(rational(n));
  }

  /** Value of a Number node. */
  valueOf(node: Node): Rational {
    return this.numbers[this.a[node] ?? 0] ?? ZERO;
  }

  isNumber(node: Node): boolean {
    return this.op[node] === Op.Number;
  }

  has(node: Node, flag: number): boolean {
    return ((this.flags[node] ?? 0) & flag) === flag;
  }

  mark(node: Node, flag: number): Node {
    this.flags[node] = (this.flags[node] ?? 0) | flag;
    return node;
  }

  variable(variable: Variable): Node {
    const index = this.variables.push(variable) - 1;
    return this.node(Op.Symbol, index, 0, variableFlags(variable));
  }

  /** The node (op, a, b), new or shared; `flags` holds for a new one. */
  node(op: number, a: number, b: number, flags: number): Node {
    const mask = this.table.length - 1;
    let slot = hash(op, a, b) & mask;
    for (;;) {
      const found = (this.table[slot] ?? 0) - 1;
      if (found < 0) break;
      if (this.op[found] === op && this.a[found] === a && this.b[found] === b) return found;
      slot = (slot + 1) & mask;
    }
    const node = this.append(op, a, b, flags);
    this.table[slot] = node + 1;
    if (this.size * 2 > this.table.length) this.rehash();
    return node;
  }

  private append(op: number, a: number, b: number, flags: number): Node {
    this.spend(1);
    if (this.size >= MAXIMUM_NODES) throw new BudgetExceeded('too many nodes');
    if (this.size === this.op.length) this.grow();
    const node = this.size++;
    this.op[node] = op;
    this.a[node] = a;
    this.b[node] = b;
    this.flags[node] = flags;
    return node;
  }

  private smallNodes: Node[] = [];

  private smallNumber(n: number, value: Rational): Node {
    const known = this.smallNodes[n + 8];
    if (known !== undefined) return known;
    const node = this.addNumber(value);
    this.smallNodes[n + 8] = node;
    return node;
  }

  private addNumber(value: Rational): Node {
    const sign = isZero(value)
      ? Flag.NonNegative | Flag.NonPositive
      : (isNegative(value) ? Flag.NonPositive : Flag.NonNegative) | Flag.NonZero;
    return this.append(Op.Number, this.numbers.push(value) - 1, 0, Flag.Real | sign);
  }

  private rehash(): void {
    this.table = new Int32Array(this.table.length * 4);
    const mask = this.table.length - 1;
    for (let node = 0; node < this.size; node++) {
      const op = this.op[node] ?? 0;
      if (op === Op.Number) continue;
      let slot = hash(op, this.a[node]!, this.b[node]!) & mask;
      while ((this.table[slot] ?? 0) !== 0) slot = (slot + 1) & mask;
      this.table[slot] = node + 1;
    }
  }

  private grow(): void {
    const size = this.op.length * 2;
    this.op = enlarge(this.op, new Uint8Array(size));
    this.a = enlarge(this.a, new Int32Array(size));
    this.b = enlarge(this.b, new Int32Array(size));
    this.flags = enlarge(this.flags, new Uint8Array(size));
  }
}

/** Larger storage than this is let go after a check. */
const RETAINED_NODES = 8192;
const RETAINED_BUFFERS = 64;
let spare: Graph | null = null;

/** Largest exponent a Power node may carry. */
export const MAXIMUM_EXPONENT = 1_000_000;

function hash(op: number, a: number, b: number): number {
  const mixed = Math.imul(a, 0x9e3779b1) ^ Math.imul(b + (op << 20), 0x85ebca6b);
  return (mixed ^ (mixed >>> 15)) >>> 0;
}

function enlarge<T extends Uint8Array | Int32Array>(from: T, into: T): T {
  into.set(from);
  return into;
}

function variableFlags(variable: Variable): number {
  switch (variable.domain) {
    case 'positive':
      return POSITIVE;
    case 'nonnegative':
      return Flag.Real | Flag.NonNegative;
    case 'nonzero':
      return Flag.Real | Flag.NonZero;
    case 'between':
      if (variable.low > 0 || variable.high < 0)
        return Flag.Real | Flag.NonZero | (variable.low > 0 ? Flag.NonNegative : Flag.NonPositive);
      if (variable.low >= 0) return Flag.Real | Flag.NonNegative;
      return variable.high <= 0 ? Flag.Real | Flag.NonPositive : Flag.Real;
    case 'real':
    case 'integer':
      return Flag.Real;
  }
}

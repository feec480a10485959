import { type SymbolDomain } from '../contract';
import { type Requirement } from '../equivalence/sample-points';
import { type Expression, type ReferenceName } from '../notation/tree';
import { Flag, Graph, type Node, POSITIVE, type Variable } from './graph';
import { lower, type Lowering } from './lower';
import { referenceFunction } from './reference-functions';
import { toNumber } from './rational';
import { add, multiply } from './scalars';
import { scalarValue, Unsupported, type Value } from './value';
import { NumericPoint } from '../equivalence/numeric';

/** Trees of what a request declares beside its two texts. */
export interface Declarations {
  readonly symbols: Readonly<Record<string, SymbolDomain>>;
  /** Constant expressions of the ends of an interval, by symbol. */
  readonly interval: (name: string) => readonly [Expression, Expression] | null;
  /** Defined names with the trees they stand for. */
  readonly definitions: ReadonlyMap<string, Expression>;
  /** Names that stand for values worked out elsewhere (a student's earlier answers). */
  readonly values?: ReadonlyMap<string, Value>;
}

/** The graph of one check with its symbols: created when first met, real variables in the order of first use. */
export class Environment implements Lowering {
  readonly g = Graph.acquire();
  readonly hbar: Node;
  plusMinus: 1 | -1 = 1;
  /** Conditions that sample points must meet. */
  readonly requirements: Requirement[] = [];
  /** Variables that an assumption determines, with the node of their value (for showing a witness). */
  readonly solutions = new Map<number, Node>();
  /** Why an assumption could not be built into the points, if so; then no witness counts. */
  unsolved: string | null = null;
  /** Set by the checker: exact equality, for the conditions of reference functions. */
  equal: (x: Node, y: Node) => boolean = (x, y) => x === y;
  private readonly known = new Map<string, Value>();
  private readonly inProgress = new Set<string>();

  constructor(private readonly declarations: Declarations) {
    this.hbar = this.g.variable(variable('hbar', 'whole', 'positive'));
  }

  lower(tree: Expression, plusMinus: 1 | -1 = 1): Value {
    this.plusMinus = plusMinus;
    return lower(tree, this);
  }

  reference(name: ReferenceName, values: readonly Value[]): Value {
    return referenceFunction(name, values, { g: this.g, hbar: this.hbar, equal: this.equal });
  }

  symbol(name: string): Value {
    const known = this.known.get(name) ?? this.declarations.values?.get(name);
    if (known) return known;
    const value = this.create(name);
    this.known.set(name, value);
    return value;
  }

  /** Lets a name stand for a value from here on. */
  bind(name: string, node: Node): void {
    this.known.set(name, scalarValue(node));
  }

  domainOf(name: string): SymbolDomain | undefined {
    return this.declarations.symbols[name];
  }

  private create(name: string): Value {
    const definition = this.declarations.definitions.get(name);
    if (definition) {
      if (this.inProgress.has(name)) throw new Unsupported(`the definition of ${name} refers to itself`);
      this.inProgress.add(name);
      const value = lower(definition, this);
      this.inProgress.delete(name);
      const domain = this.declarations.symbols[name];
      if (value.type === 'scalar' && domain !== undefined) this.g.mark(value.node, flagsOfDomain(domain));
      return value;
    }
    const domain = Object.hasOwn(this.declarations.symbols, name) ? this.declarations.symbols[name] : undefined;
    if (domain === undefined) throw new Unsupported(`${name} is not declared`);
    if (domain === 'complex') {
      const re = this.g.variable(variable(name, 'real', 'real'));
      const im = this.g.variable(variable(name, 'imaginary', 'real'));
      return scalarValue(add(this.g, re, multiply(this.g, this.g.i, im)));
    }
    if (typeof domain === 'object') {
      const [low, high] = this.intervalEnds(name);
      return scalarValue(this.g.variable({ name, part: 'whole', domain: 'between', low, high }));
    }
    return scalarValue(this.g.variable(variable(name, 'whole', domain)));
  }

  private intervalEnds(name: string): [number, number] {
    const trees = this.declarations.interval(name);
    if (!trees) throw new Unsupported(`the interval of ${name} cannot be read`);
    const [low, high] = trees.map((tree) => this.constantValue(tree));
    if (low === undefined || high === undefined || !(low < high)) {
      throw new Unsupported(`the interval of ${name} is empty`);
    }
    return [low, high];
  }

  /** Real value of a constant expression. */
  private constantValue(tree: Expression): number {
    const value = lower(tree, this);
    if (value.type !== 'scalar') throw new Unsupported('the end of an interval is a number');
    if (this.g.isNumber(value.node)) return toNumber(this.g.valueOf(value.node));
    const point = new NumericPoint(this.g, new Float64Array(this.g.variables.length).fill(1));
    point.evaluate(value.node);
    if (!point.isKnown(value.node) || point.im[value.node] !== 0)
      throw new Unsupported('the end of an interval is real');
    return point.re[value.node]!;
  }
}

function variable(name: string, part: Variable['part'], domain: Variable['domain']): Variable {
  return { name, part, domain, low: -Infinity, high: Infinity };
}

/** What a declared domain says of a value. */
export function flagsOfDomain(domain: SymbolDomain): number {
  switch (domain) {
    case 'positive':
      return POSITIVE;
    case 'nonnegative':
      return Flag.Real | Flag.NonNegative;
    case 'nonzero':
      return Flag.Real | Flag.NonZero;
    case 'complex':
      return 0;
    default:
      return Flag.Real;
  }
}

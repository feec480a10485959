import { type Expression, type Factor, type FunctionName, type Term } from '../notation/tree';
import { type Graph, type Node, Op } from './graph';
import { fromPolynomial, normalForm } from './normal-form';
import { TooLarge } from './polynomial';
import { isNegative, isOne, negateRational, type Rational } from './rational';
import { coefficientOf, withoutCoefficient } from './scalars';
import { trigonometricForm } from './trigonometric-form';

const span = { start: 0, end: 0 };
const scalar = { span, type: 'scalar' } as const;

/** A scalar node as a tree that reads well: as it was built, expanded, or by single angles, whichever is shortest. */
export function scalarTree(g: Graph, node: Node): Expression {
  const built = treeOf(g, node);
  const form = normalForm(g, node);
  if (!form) return built;
  try {
    const trigonometric = trigonometricForm(g, form);
    const others = [fromPolynomial(g, form), ...(trigonometric === null ? [] : [trigonometric])];
    return others
      .map((other) => treeOf(g, other))
      .reduce((best, tree) => (complexity(tree) < complexity(best) ? tree : best), built);
  } catch (error) {
    if (error instanceof TooLarge) return built;
    throw error;
  }
}

/** Number of nodes of a tree. */
export function complexity(tree: Expression): number {
  switch (tree.node) {
    case 'sum':
      return tree.terms.reduce((n, term) => n + complexity(term.body) + (term.sign === '-' ? 1 : 0), 0) + 1;
    case 'product':
      return tree.factors.reduce((n, factor) => n + complexity(factor.body), 1);
    case 'fraction':
      return 1 + complexity(tree.numerator) + complexity(tree.denominator);
    case 'power':
      return 1 + complexity(tree.base) + complexity(tree.exponent);
    case 'root':
      return 1 + complexity(tree.radicand);
    case 'call':
    case 'reference':
      return tree.arguments.reduce((n, x) => n + complexity(x), 1);
    case 'group':
    case 'absolute':
    case 'conjugate':
    case 'adjoint':
    case 'transpose':
      return 1 + complexity(tree.body);
    case 'matrix':
      return tree.rows.flat().reduce((n, x) => n + complexity(x), 1);
    case 'column':
    case 'row':
    case 'list':
      return tree.entries.reduce((n, x) => n + complexity(x), 1);
    case 'commutator':
    case 'anticommutator':
      return 1 + complexity(tree.left) + complexity(tree.right);
    case 'number':
    case 'constant':
    case 'symbol':
    case 'operator':
    case 'identity':
    case 'ket':
    case 'bra':
      return 1;
  }
}

/** The tree of a node as it was built. */
export function treeOf(g: Graph, node: Node): Expression {
  g.spend(2);
  switch (g.op[node]) {
    case Op.Number:
      return numberTree(g.valueOf(node));
    case Op.Symbol:
      return variableTree(g, node);
    case Op.I:
      return { ...scalar, node: 'constant', name: 'i' };
    case Op.Pi:
      return { ...scalar, node: 'constant', name: 'pi' };
    case Op.Add:
      return sumTree(g, node);
    case Op.Multiply:
    case Op.Power:
      return productTree(g, node);
    case Op.Root:
      return { ...scalar, node: 'root', radicand: treeOf(g, g.a[node]!), degree: g.b[node]! };
    case Op.Exp:
      return callTree('exp', 'power', treeOf(g, g.a[node]!));
    case Op.Ln:
      return callTree('ln', 'name', treeOf(g, g.a[node]!));
    case Op.Sin:
      return callTree('sin', 'name', treeOf(g, g.a[node]!));
    case Op.Cos:
      return callTree('cos', 'name', treeOf(g, g.a[node]!));
    default:
      return { ...scalar, node: 'absolute', body: treeOf(g, g.a[node]!) };
  }
}

function callTree(name: FunctionName, written: 'name' | 'power', argument: Expression): Expression {
  return { ...scalar, node: 'call', name, written, arguments: [argument] };
}

function variableTree(g: Graph, node: Node): Expression {
  const { name, part } = g.variables[g.a[node]!]!;
  const solution = g.solved.get(g.a[node]!);
  if (solution !== undefined) return treeOf(g, solution);
  if (name === 'hbar') return { ...scalar, node: 'constant', name: 'hbar' };
  const symbol: Expression = { ...scalar, node: 'symbol', name };
  return part === 'whole' ? symbol : callTree(part === 'real' ? 'Re' : 'Im', 'name', symbol);
}

function numberTree(value: Rational): Expression {
  if (isNegative(value)) return negation(numberTree(negateRational(value)));
  const [n, d] = [BigInt(value.n), BigInt(value.d)];
  if (d === 1n) return integerTree(n);
  return { ...scalar, node: 'fraction', numerator: integerTree(n), denominator: integerTree(d) };
}

function integerTree(n: bigint): Expression {
  const mantissa = n.toString();
  return {
    ...scalar,
    node: 'number',
    numerator: n,
    denominator: 1n,
    mantissa,
    exponent: 0,
    decimal: false,
    decimals: 0,
    significantFigures: mantissa.length,
    scientific: false,
  };
}

const negation = (body: Expression): Expression => ({ ...scalar, node: 'sum', terms: [{ sign: '-', body }] });

/** Terms of a sum; x + iy of a complex symbol is the symbol, x − iy its conjugate. */
function sumTree(g: Graph, node: Node): Expression {
  const nodes: Node[] = [];
  const flatten = (x: Node): void => {
    if (g.op[x] !== Op.Add) nodes.push(x);
    else {
      flatten(g.a[x]!);
      flatten(g.b[x]!);
    }
  };
  flatten(node);
  const terms: Term[] = [];
  for (const item of joinComplexSymbols(g, nodes)) {
    if (typeof item !== 'number') {
      terms.push({ sign: '+', body: item });
      continue;
    }
    const negative = isNegative(coefficientOf(g, item));
    const body = negative
      ? scaledTree(g, negateRational(coefficientOf(g, item)), withoutCoefficient(g, item))
      : treeOf(g, item);
    terms.push({ sign: negative ? '-' : '+', body });
  }
  const positive = terms.findIndex(({ sign }) => sign === '+');
  if (positive > 0) terms.unshift(...terms.splice(positive, 1));
  const [only] = terms;
  return terms.length === 1 && only?.sign === '+' ? only.body : { ...scalar, node: 'sum', terms };
}

function joinComplexSymbols(g: Graph, nodes: readonly Node[]): (Node | Expression)[] {
  const items: (Node | Expression)[] = [...nodes];
  for (const [k, node] of nodes.entries()) {
    if (g.op[node] !== Op.Symbol || g.variables[g.a[node]!]!.part !== 'real') continue;
    const { name } = g.variables[g.a[node]!]!;
    const other = nodes.findIndex((x) => imaginaryName(g, x) === name);
    if (other < 0) continue;
    const symbol: Expression = { ...scalar, node: 'symbol', name };
    const negative = isNegative(coefficientOf(g, nodes[other]!));
    items[k] = negative ? { ...scalar, node: 'conjugate', body: symbol } : symbol;
    items[other] = -1;
  }
  return items.filter((item) => item !== -1);
}

/** The symbol whose imaginary part y makes the node ±iy. */
function imaginaryName(g: Graph, node: Node): string | null {
  const c = coefficientOf(g, node);
  const rest = withoutCoefficient(g, node);
  if (!isOne(c) && !isOne(negateRational(c))) return null;
  if (g.op[rest] !== Op.Multiply || g.a[rest] !== g.i || g.op[g.b[rest]!] !== Op.Symbol) return null;
  const variable = g.variables[g.a[g.b[rest]!]!]!;
  return variable.part === 'imaginary' ? variable.name : null;
}

function scaledTree(g: Graph, c: Rational, rest: Node): Expression {
  if (rest === g.one) return numberTree(c);
  return productOf(g, c, rest);
}

function productTree(g: Graph, node: Node): Expression {
  const c = coefficientOf(g, node);
  const rest = withoutCoefficient(g, node);
  return isNegative(c) ? negation(productOf(g, negateRational(c), rest)) : productOf(g, c, rest);
}

/** c·rest for c > 0, with negative powers under one fraction stroke. */
function productOf(g: Graph, c: Rational, rest: Node): Expression {
  const above: Expression[] = [];
  const below: Expression[] = [];
  for (let at: Node = rest; ; at = g.b[at]!) {
    const factor = g.op[at] === Op.Multiply ? g.a[at]! : at;
    if (g.op[factor] === Op.Power) {
      const n = g.b[factor]!;
      (n < 0 ? below : above).push(powerTree(treeOf(g, g.a[factor]!), Math.abs(n)));
    } else above.push(treeOf(g, factor));
    if (g.op[at] !== Op.Multiply) break;
  }
  const [n, d] = [BigInt(c.n), BigInt(c.d)];
  if (n !== 1n || above.length === 0) above.unshift(integerTree(n));
  if (d !== 1n) below.unshift(integerTree(d));
  const numerator = joined(above);
  return below.length === 0 ? numerator : { ...scalar, node: 'fraction', numerator, denominator: joined(below) };
}

function powerTree(base: Expression, n: number): Expression {
  if (n === 1) return base;
  return { ...scalar, node: 'power', base, exponent: integerTree(BigInt(n)), placed: 'after' };
}

function joined(bodies: readonly Expression[]): Expression {
  const [only] = bodies;
  if (bodies.length === 1 && only) return only;
  const factors: Factor[] = bodies.map((body) => ({ join: 'unwritten', body }));
  return { ...scalar, node: 'product', factors };
}

import { type Condition, type Relation } from '../notation/answer-tree';
import { type Expression } from '../notation/tree';
import { type Environment, flagsOfDomain } from './environment';
import { Flag, type Graph, type Node, Op } from './graph';
import { fromPolynomial, normalForm } from './normal-form';
import { addTerm, emptyPolynomial, monomialKey, type Polynomial } from './polynomial';
import { squareRoot } from './roots';
import { add, divide, multiply, negate, power, scale, subtract } from './scalars';
import { rational } from './rational';
import { type Value } from './value';

/**
 * Builds an assumption into the environment: `name = expression` lets the name stand for it, another equation is solved
 * for a variable in which it is linear or quadratic, an inequality becomes a requirement of the sample points.
 */
export function assume(environment: Environment, condition: Condition): void {
  switch (condition.node) {
    case 'and':
      for (const part of condition.parts) assume(environment, part);
      return;
    case 'comparison':
      for (let k = 0; k + 1 < condition.operands.length; k++) {
        link(environment, condition.operands[k]!, condition.relations[k]!, condition.operands[k + 1]!);
      }
      return;
    case 'or':
    case 'not':
      environment.unsolved = 'an assumption with “or” or “not” cannot be used';
  }
}

function link(environment: Environment, left: Expression, relation: Relation, right: Expression): void {
  if (relation !== '=') {
    const [x, y] = [scalarOf(environment.lower(left)), scalarOf(environment.lower(right))];
    environment.requirements.push({ left: x, right: y, relation });
    return;
  }
  if (substitutes(environment, left, right) || substitutes(environment, right, left)) return;
  const { g } = environment;
  const difference = subtract(g, scalarOf(environment.lower(left)), scalarOf(environment.lower(right)));
  if (!solve(environment, difference)) environment.unsolved = 'an assumption could not be solved for a symbol';
}

function scalarOf(value: Value): Node {
  return value.type === 'scalar' ? value.node : 0;
}

/** `name = expression`, the name not in the expression: a substitution that keeps the name's domain. */
function substitutes(environment: Environment, side: Expression, other: Expression): boolean {
  if (side.node !== 'symbol' || mentions(other, side.name)) return false;
  const domain = environment.domainOf(side.name);
  if (domain === undefined || domain === 'integer' || typeof domain === 'object') return false;
  const { g } = environment;
  const node = scalarOf(environment.lower(other));
  g.mark(node, flagsOfDomain(domain));
  requireDomain(environment, node, domain);
  environment.bind(side.name, node);
  return true;
}

function requireDomain(environment: Environment, node: Node, domain: string): void {
  const relation = domain === 'positive' ? '>' : domain === 'nonnegative' ? '>=' : domain === 'nonzero' ? '!=' : null;
  if (relation) environment.requirements.push({ left: node, right: environment.g.zero, relation });
}

function mentions(tree: Expression, name: string): boolean {
  return JSON.stringify(tree, (_, value: unknown) => (typeof value === 'bigint' ? value.toString() : value)).includes(
    `"name":${JSON.stringify(name)}`,
  );
}

/**
 * Solves difference = 0 for the last variable that occurs at most squared and in nothing but powers. The variable's node
 * is given a value; its square has a normal form, so that what the assumption simplifies becomes simple.
 */
function solve(environment: Environment, difference: Node): boolean {
  const { g } = environment;
  const form = normalForm(g, difference);
  if (!form) return false;
  for (let index = g.variables.length - 1; index >= 0; index--) {
    const variable = g.variables[index]!;
    if (variable.name === 'hbar' || variable.domain === 'integer' || variable.domain === 'between') continue;
    const node = g.node(Op.Symbol, index, 0, 0);
    const parts = coefficients(g, form, node);
    if (!parts) continue;
    const [c, b, a] = parts.map((part) => fromPolynomial(g, part)) as [Node, Node, Node];
    if (a === g.zero && b === g.zero) continue;
    install(environment, index, node, a, b, c);
    return true;
  }
  return false;
}

/** Coefficients of 1, s, s² in a form; null where s occurs otherwise. */
function coefficients(g: Graph, form: Polynomial, s: Node): [Polynomial, Polynomial, Polynomial] | null {
  const parts: [Polynomial, Polynomial, Polynomial] = [emptyPolynomial(), emptyPolynomial(), emptyPolynomial()];
  for (const { coefficient, monomial } of form.values()) {
    let degree = 0;
    for (const { atom, exponent } of monomial) {
      if (atom === s) {
        if (exponent.big || exponent.d !== 1 || exponent.n < 0 || exponent.n > 2) return null;
        degree = exponent.n;
      } else if (restsOn(g, atom, s)) return null;
    }
    const rest = monomial.filter(({ atom }) => atom !== s);
    addTerm(parts[degree]!, monomialKey(rest), coefficient, rest);
  }
  return parts;
}

function restsOn(g: Graph, node: Node, s: Node): boolean {
  if (node === s) return true;
  if (node < s) return false;
  const op = g.op[node]!;
  if (op === Op.Number || op === Op.Symbol || op === Op.I || op === Op.Pi) return false;
  if (restsOn(g, g.a[node]!, s)) return true;
  return (op === Op.Add || op === Op.Multiply) && restsOn(g, g.b[node]!, s);
}

/** a s² + b s + c = 0: s = −c/b, or s = t with t² = −c/a, or s = (t − b)/2a with t² = b² − 4ac. */
function install(environment: Environment, index: number, s: Node, a: Node, b: Node, c: Node): void {
  const { g } = environment;
  const variable = g.variables[index]!;
  const signed = variable.domain === 'real' || variable.domain === 'nonzero';
  let solution: Node;
  if (a === g.zero) {
    solution = negate(g, divide(g, c, b));
    environment.requirements.push({ left: solution, right: g.zero, relation: 'real' });
  } else {
    const square =
      b === g.zero ? negate(g, divide(g, c, a)) : subtract(g, power(g, b, 2), scale(g, rational(4), multiply(g, a, c)));
    const t = squareVariable(environment, square, signed || b !== g.zero);
    solution = b === g.zero ? t : divide(g, subtract(g, t, b), scale(g, rational(2), a));
  }
  g.mark(solution, g.flags[s]!);
  requireDomain(environment, solution, variable.domain);
  replace(environment, index, solution);
}

/** A new real variable whose square is given; `signed` lets it take either root. */
function squareVariable(environment: Environment, square: Node, signed: boolean): Node {
  const { g } = environment;
  g.mark(square, Flag.Real | Flag.NonNegative);
  const root = squareRoot(g, square);
  environment.requirements.push({ left: root, right: g.zero, relation: 'real' });
  const domain = signed ? 'real' : 'nonnegative';
  const index = g.variables.length;
  const node = g.variable({ name: '', part: 'whole', domain, low: -Infinity, high: Infinity });
  g.solved.set(index, root);
  g.squares.set(index, square);
  return node;
}

/** Puts the solution in the place of the variable, of one part of it where it is complex. */
function replace(environment: Environment, index: number, solution: Node): void {
  const { g } = environment;
  const { name, part } = g.variables[index]!;
  environment.solutions.set(index, solution);
  if (part === 'whole') {
    environment.bind(name, solution);
    return;
  }
  const other = g.variables.findIndex(
    (v, k) => k !== index && v.name === name && v.part !== 'whole' && v.part !== part,
  );
  const otherNode = g.node(Op.Symbol, other, 0, 0);
  const [re, im] = part === 'real' ? [solution, otherNode] : [otherNode, solution];
  environment.bind(name, add(g, re, multiply(g, g.i, im)));
}

import {
  type CallNode,
  type ConstantName,
  type Expression,
  type OperatorNode,
  type StateLabel,
} from '../notation/tree';
import { conjugate, imaginaryPart, modulus, realPart } from './conjugate';
import * as functions from './functions';
import { type Graph, type Node } from './graph';
import * as operators from './operators';
import { type Components, type Operator } from './operators';
import { bigRational, HALF, type Rational, rational } from './rational';
import { root } from './roots';
import { ln } from './logarithm';
import { rootOfRational } from './root-of-rational';
import { add, cos, exp, multiply, negate, pi, power, scale, sin } from './scalars';
import {
  asOperator,
  asScalar,
  braValue,
  ketValue,
  listValue,
  operatorValue,
  scalarValue,
  Unsupported,
  type Value,
} from './value';

/** What names stand for while trees are turned into values. */
export interface Lowering {
  readonly g: Graph;
  /** Value of a declared or defined name. */
  symbol(name: string): Value;
  readonly hbar: Node;
  /** Sign that ± takes in this pass; ∓ takes the opposite. */
  readonly plusMinus: 1 | -1;
  /** Works out a reference function. */
  reference(name: string, values: readonly Value[]): Value;
}

/** The value of an expression tree; throws DefinedNowhere, Unsupported, ReferenceProblem or BudgetExceeded. */
export function lower(tree: Expression, l: Lowering): Value {
  const { g } = l;
  switch (tree.node) {
    case 'number':
      return scalarValue(g.number(exactValue(tree.numerator, tree.denominator)));
    case 'constant':
      return scalarValue(constant(tree.name, l));
    case 'symbol':
      return l.symbol(tree.name);
    case 'group':
      return lower(tree.body, l);
    case 'sum': {
      let total: Value | null = null;
      for (const { sign, body } of tree.terms) {
        const value = lower(body, l);
        const minus = sign === '-' || (sign === '±' && l.plusMinus < 0) || (sign === '∓' && l.plusMinus > 0);
        const term = minus ? scaled(g, g.integer(-1), value) : value;
        total = total === null ? term : plus(g, total, term);
      }
      return total ?? scalarValue(g.zero);
    }
    case 'product': {
      let total: Value | null = null;
      for (const { join, body } of tree.factors) {
        const value = lower(body, l);
        if (total === null) total = value;
        else if (join === 'over') total = scaled(g, power(g, asScalar(value), -1), total);
        else total = times(g, total, value);
      }
      return total ?? scalarValue(g.one);
    }
    case 'fraction':
      return scaled(g, power(g, asScalar(lower(tree.denominator, l)), -1), lower(tree.numerator, l));
    case 'power':
      return raised(g, lower(tree.base, l), asScalar(lower(tree.exponent, l)));
    case 'root':
      return scalarValue(root(g, asScalar(lower(tree.radicand, l)), tree.degree));
    case 'call':
      return call(tree, l);
    case 'absolute':
      return scalarValue(modulus(g, asScalar(lower(tree.body, l))));
    case 'conjugate':
      return conjugated(g, lower(tree.body, l));
    case 'adjoint':
      return adjoint(g, lower(tree.body, l));
    case 'transpose':
      return transposed(lower(tree.body, l));
    case 'operator':
      return operatorValue(namedOperator(tree, l));
    case 'identity':
      return operatorValue(operators.identityTimes(g, g.one));
    case 'matrix': {
      const [[a, b], [c, d]] = tree.rows;
      const entry = (x: Expression): Node => asScalar(lower(x, l));
      return operatorValue([entry(a), entry(b), entry(c), entry(d)]);
    }
    case 'column':
      return ketValue([asScalar(lower(tree.entries[0], l)), asScalar(lower(tree.entries[1], l))]);
    case 'row':
      return braValue([asScalar(lower(tree.entries[0], l)), asScalar(lower(tree.entries[1], l))]);
    case 'ket':
      return ketValue(namedState(g, tree.state));
    case 'bra':
      return braValue(operators.conjugateComponents(g, namedState(g, tree.state)));
    case 'commutator':
      return operatorValue(
        operators.commutator(g, asOperator(g, lower(tree.left, l)), asOperator(g, lower(tree.right, l))),
      );
    case 'anticommutator':
      return operatorValue(
        operators.anticommutator(g, asOperator(g, lower(tree.left, l)), asOperator(g, lower(tree.right, l))),
      );
    case 'list':
      return listValue(tree.entries.map((entry) => asScalar(lower(entry, l))));
    case 'reference':
      return l.reference(
        tree.name,
        tree.arguments.map((argument) => lower(argument, l)),
      );
  }
}

function exactValue(numerator: bigint, denominator: bigint): Rational {
  if (numerator < 9007199254740992n && denominator < 9007199254740992n && numerator > -9007199254740992n) {
    return rational(Number(numerator), Number(denominator));
  }
  return bigRational(numerator, denominator);
}

function constant(name: ConstantName, { g, hbar }: Lowering): Node {
  switch (name) {
    case 'i':
      return g.i;
    case 'pi':
      return pi(g);
    case 'hbar':
      return hbar;
    case 'planck':
      return scale(g, rational(2), multiply(g, pi(g), hbar));
    case 'euler':
      return exp(g, g.one);
  }
}

function plus(g: Graph, x: Value, y: Value): Value {
  if (x.type === 'scalar' && y.type === 'scalar') return scalarValue(add(g, x.node, y.node));
  if (x.type === 'operator' || y.type === 'operator') {
    return operatorValue(operators.addOperators(g, asOperator(g, x), asOperator(g, y)));
  }
  if (x.type === 'list' && y.type === 'list' && x.entries.length === y.entries.length) {
    return listValue(x.entries.map((entry, k) => add(g, entry, y.entries[k]!)));
  }
  if ((x.type === 'ket' || x.type === 'bra') && x.type === y.type) {
    const sum: Components = [add(g, x.components[0], y.components[0]), add(g, x.components[1], y.components[1])];
    return { type: x.type, components: sum };
  }
  throw new Unsupported('these cannot be added');
}

function scaled(g: Graph, c: Node, x: Value): Value {
  switch (x.type) {
    case 'scalar':
      return scalarValue(multiply(g, c, x.node));
    case 'operator':
      return operatorValue(operators.scaleOperator(g, c, x.matrix));
    case 'ket':
    case 'bra':
      return { type: x.type, components: [multiply(g, c, x.components[0]), multiply(g, c, x.components[1])] };
    case 'list':
      return listValue(x.entries.map((entry) => multiply(g, c, entry)));
    case 'pairs':
      throw new Unsupported('eigenpairs cannot be multiplied');
  }
}

function times(g: Graph, x: Value, y: Value): Value {
  if (x.type === 'scalar') return scaled(g, x.node, y);
  if (y.type === 'scalar') return scaled(g, y.node, x);
  if (x.type === 'operator' && y.type === 'operator') {
    return operatorValue(operators.multiplyOperators(g, x.matrix, y.matrix));
  }
  if (x.type === 'operator' && y.type === 'ket') return ketValue(operators.applyToKet(g, x.matrix, y.components));
  if (x.type === 'bra' && y.type === 'operator') return braValue(operators.applyToBra(g, x.components, y.matrix));
  if (x.type === 'bra' && y.type === 'ket') return scalarValue(operators.contract(g, x.components, y.components));
  if (x.type === 'ket' && y.type === 'bra') return operatorValue(operators.outer(g, x.components, y.components));
  throw new Unsupported('these cannot be multiplied');
}

function raised(g: Graph, base: Value, exponent: Node): Value {
  if (base.type === 'scalar') return scalarValue(functions.generalPower(g, base.node, exponent));
  const n = g.isNumber(exponent) ? g.valueOf(exponent) : null;
  if (base.type !== 'operator' || !n || n.big || n.d !== 1 || Math.abs(n.n) > 10000) {
    throw new Unsupported('this power is not worked out');
  }
  return operatorValue(operators.operatorPower(g, base.matrix, n.n));
}

function conjugated(g: Graph, x: Value): Value {
  switch (x.type) {
    case 'scalar':
      return scalarValue(conjugate(g, x.node));
    case 'operator':
      return operatorValue(operators.conjugateOperator(g, x.matrix));
    case 'ket':
    case 'bra':
      return { type: x.type, components: operators.conjugateComponents(g, x.components) };
    case 'list':
      return listValue(x.entries.map((entry) => conjugate(g, entry)));
    case 'pairs':
      throw new Unsupported('eigenpairs cannot be conjugated');
  }
}

function adjoint(g: Graph, x: Value): Value {
  return transposed(conjugated(g, x));
}

function transposed(x: Value): Value {
  switch (x.type) {
    case 'operator':
      return operatorValue(operators.transpose(x.matrix));
    case 'ket':
      return braValue(x.components);
    case 'bra':
      return ketValue(x.components);
    case 'scalar':
    case 'list':
    case 'pairs':
      return x;
  }
}

/** σ_± = (σ_x ± iσ_y)/2; S = ħσ/2, S_± = S_x ± iS_y = ħσ_±. */
function namedOperator({ family, index }: OperatorNode, { g, hbar }: Lowering): Operator {
  const { zero, one, i } = g;
  const minusOne = g.integer(-1);
  const pauli: Operator =
    index === 'x'
      ? [zero, one, one, zero]
      : index === 'y'
        ? [zero, negate(g, i), i, zero]
        : index === 'z'
          ? [one, zero, zero, minusOne]
          : index === '+'
            ? [zero, one, zero, zero]
            : [zero, zero, one, zero];
  if (family === 'pauli') return pauli;
  return operators.scaleOperator(g, index === '+' || index === '-' ? hbar : scale(g, HALF, hbar), pauli);
}

function namedState(g: Graph, label: StateLabel): Components {
  if (label === '+z') return [g.one, g.zero];
  if (label === '-z') return [g.zero, g.one];
  const first = rootOfRational(g, HALF, 2);
  const second = label.endsWith('x') ? first : multiply(g, g.i, first);
  return [first, label.startsWith('-') ? negate(g, second) : second];
}

function call(tree: CallNode, l: Lowering): Value {
  const { g } = l;
  const [first, second] = tree.arguments;
  if (!first) throw new Unsupported('a function without argument');
  const value = lower(first, l);
  if (tree.name === 'exp' && value.type === 'operator') {
    return operatorValue(operators.exponentialOfOperator(g, value.matrix));
  }
  const x = asScalar(value);
  if (tree.name === 'atan2') return scalarValue(functions.atan2(g, x, second ? asScalar(lower(second, l)) : g.one));
  return scalarValue(scalarFunctions[tree.name](g, x));
}

const scalarFunctions: Record<Exclude<CallNode['name'], 'atan2'>, (g: Graph, x: Node) => Node> = {
  sin,
  cos,
  tan: functions.tan,
  sec: functions.sec,
  csc: functions.csc,
  cot: functions.cot,
  sinh: functions.sinh,
  cosh: functions.cosh,
  tanh: functions.tanh,
  asin: functions.asin,
  acos: functions.acos,
  atan: functions.atan,
  asinh: functions.asinh,
  acosh: functions.acosh,
  atanh: functions.atanh,
  exp,
  ln,
  log: ln,
  Re: realPart,
  Im: imaginaryPart,
};

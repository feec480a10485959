import { type ReferenceName } from '../notation/tree';
import { absoluteSquare, conjugate } from './conjugate';
import { type Graph, type Node } from './graph';
import * as operators from './operators';
import { type Components, type Operator } from './operators';
import { fromPolynomial, normalForm } from './normal-form';
import { HALF, MINUS_ONE, rational } from './rational';
import { squareRoot } from './roots';
import { ln } from './logarithm';
import { add, cos, divide, exp, multiply, negate, power, scale, sin, subtract, sum } from './scalars';
import {
  asKet,
  asList,
  asOperator,
  asScalar,
  type Eigenpair,
  ketValue,
  listValue,
  operatorValue,
  ReferenceProblem,
  scalarValue,
  type Value,
} from './value';

/** What a reference function needs beside its arguments. */
export interface ReferenceContext {
  readonly g: Graph;
  readonly hbar: Node;
  /** Whether two scalars are equal over the whole domain, exactly. */
  readonly equal: (x: Node, y: Node) => boolean;
}

type ReferenceFunction = (c: ReferenceContext, ...values: Value[]) => Value;

/** Works out a reference function; its formula and source stand at each. */
export function referenceFunction(name: ReferenceName, values: readonly Value[], c: ReferenceContext): Value {
  return table[name](c, ...values);
}

/** The density operator of a normalised state, or a density operator itself; anything unnormalised is an error. */
function densityOf(c: ReferenceContext, state: Value): Operator {
  const { g } = c;
  if (state.type === 'ket') {
    requireUnit(c, operators.normSquared(g, state.components), 'the state is not normalised');
    return operators.outer(g, state.components, operators.conjugateComponents(g, state.components));
  }
  const rho = asOperator(g, state);
  requireUnit(c, operators.trace(g, rho), 'the density operator does not have trace 1');
  return rho;
}

function requireUnit(c: ReferenceContext, norm: Node, message: string): void {
  if (norm !== c.g.one && !c.equal(norm, c.g.one)) throw new ReferenceProblem(message);
}

/** ⟨A⟩ = ⟨ψ|A|ψ⟩ or Tr ρA (Sakurai & Napolitano §1.4, §3.4). */
function expectation(c: ReferenceContext, a: Operator, state: Value): Node {
  const { g } = c;
  if (state.type === 'ket') {
    requireUnit(c, operators.normSquared(g, state.components), 'the state is not normalised');
    const bra = operators.conjugateComponents(g, state.components);
    return operators.contract(g, bra, operators.applyToKet(g, a, state.components));
  }
  return operators.trace(g, operators.multiplyOperators(g, densityOf(c, state), a));
}

/** ⟨A²⟩ − ⟨A⟩² (Sakurai & Napolitano §1.4). */
function variance(c: ReferenceContext, a: Operator, state: Value): Node {
  const square = expectation(c, operators.multiplyOperators(c.g, a, a), state);
  return subtract(c.g, square, power(c.g, expectation(c, a, state), 2));
}

/** r_k = Tr ρσ_k (Bloch 1946; Nielsen & Chuang §2.4.2). */
function bloch(c: ReferenceContext, rho: Operator): Node[] {
  const [, x, y, z] = operators.pauliCoefficients(c.g, rho);
  return [x, y, z].map((node) => scale(c.g, rational(2), node));
}

/** The two eigenvalues a0 ± √(a·a) with eigenvectors (m12, λ − m11) or (λ − m22, m21). */
function eigenpairs(c: ReferenceContext, matrix: Operator): Eigenpair[] {
  const { g } = c;
  const [m11, m12, m21, m22] = matrix;
  const zero = (node: Node): boolean => node === g.zero || c.equal(node, g.zero);
  if (zero(m12) && zero(m21)) {
    return [
      { value: m11, state: [g.one, g.zero] },
      { value: m22, state: [g.zero, g.one] },
    ];
  }
  const { centre, splitting } = operators.centreAndSplitting(g, matrix);
  if (zero(splitting)) throw new ReferenceProblem('the operator has only one eigenvector');
  return [splitting, negate(g, splitting)].map((shift) => {
    const value = add(g, centre, shift);
    const state: Components = zero(m12) ? [subtract(g, value, m22), m21] : [m12, subtract(g, value, m11)];
    return { value, state: withoutCommonFactor(g, state) };
  });
}

/** (1, r) where the components' ratio is a constant, so that ħ and the like do not stand in a state. */
function withoutCommonFactor(g: Graph, state: Components): Components {
  if (state[0] === g.zero || state[1] === g.zero)
    return [state[0] === g.zero ? g.zero : g.one, state[1] === g.zero ? g.zero : g.one];
  const form = normalForm(g, divide(g, state[1], state[0]));
  if (!form || form.size > 2) return state;
  for (const { monomial } of form.values()) {
    if (monomial.some(({ atom }) => atom !== g.i && !g.isNumber(atom))) return state;
  }
  return [g.one, fromPolynomial(g, form)];
}

/** e^{−iHt/ħ} (Sakurai & Napolitano §2.1). */
function propagator({ g, hbar }: ReferenceContext, h: Operator, t: Node): Operator {
  const factor = scale(g, MINUS_ONE, multiply(g, g.i, divide(g, t, hbar)));
  return operators.exponentialOfOperator(g, operators.scaleOperator(g, factor, h));
}

/** v·σ for three components. */
function dotSigma(g: Graph, v: readonly Node[]): Operator {
  const [x, y, z] = v;
  if (x === undefined || y === undefined || z === undefined || v.length !== 3) {
    throw new ReferenceProblem('three components are needed');
  }
  return operators.fromPauli(g, [g.zero, x, y, z]);
}

/** −Σ p ln p over the eigenvalues (1 ± r)/2, with 0 ln 0 = 0 (von Neumann 1927). */
function entropy(c: ReferenceContext, rho: Operator): Node {
  const { g } = c;
  const { centre, splitting } = operators.centreAndSplitting(g, rho);
  const terms = [add(g, centre, splitting), subtract(g, centre, splitting)]
    .filter((p) => p !== g.zero && !c.equal(p, g.zero))
    .map((p) => multiply(g, p, ln(g, p)));
  return negate(g, sum(g, terms));
}

const scalarOf =
  (f: (c: ReferenceContext, ...values: Value[]) => Node): ReferenceFunction =>
  (c, ...values) =>
    scalarValue(f(c, ...values));
const operatorOf =
  (f: (c: ReferenceContext, ...values: Value[]) => Operator): ReferenceFunction =>
  (c, ...values) =>
    operatorValue(f(c, ...values));

const table: Record<ReferenceName, ReferenceFunction> = {
  commutator: operatorOf(({ g }, a, b) => operators.commutator(g, asOperator(g, a), asOperator(g, b))),
  anticommutator: operatorOf(({ g }, a, b) => operators.anticommutator(g, asOperator(g, a), asOperator(g, b))),
  /** a0 ± √(a·a) for a0·1 + a·σ. */
  eigenvalues: ({ g }, a) => {
    const { centre, splitting } = operators.centreAndSplitting(g, asOperator(g, a));
    return listValue([add(g, centre, splitting), subtract(g, centre, splitting)]);
  },
  eigenpairs: (c, a) => ({ type: 'pairs', pairs: eigenpairs(c, asOperator(c.g, a)) }),
  trace: scalarOf(({ g }, a) => operators.trace(g, asOperator(g, a))),
  determinant: scalarOf(({ g }, a) => operators.determinant(g, asOperator(g, a))),
  adjoint: ({ g }, a) => {
    if (a.type === 'ket' || a.type === 'bra') {
      const components = operators.conjugateComponents(g, a.components);
      return { type: a.type === 'ket' ? 'bra' : 'ket', components };
    }
    return a.type === 'scalar'
      ? scalarValue(conjugate(g, a.node))
      : operatorValue(operators.adjoint(g, asOperator(g, a)));
  },
  /** a0 = ½Tr A, a_k = ½Tr σ_k A (Pauli 1927). */
  pauli: ({ g }, a) => listValue(operators.pauliCoefficients(g, asOperator(g, a))),
  expectation: scalarOf((c, a, state) => expectation(c, asOperator(c.g, a), state)),
  variance: scalarOf((c, a, state) => variance(c, asOperator(c.g, a), state)),
  /** √(variance). */
  uncertainty: scalarOf((c, a, state) => squareRoot(c.g, variance(c, asOperator(c.g, a), state))),
  /** |⟨φ|ψ⟩|² of normalised states, or ⟨φ|ρ|φ⟩ (Born 1926). */
  probability: scalarOf((c, phi, state) => {
    const { g } = c;
    const x = asKet(phi);
    requireUnit(c, operators.normSquared(g, x), 'the state is not normalised');
    if (state.type !== 'ket') return expectation(c, densityOf(c, state), phi);
    requireUnit(c, operators.normSquared(g, state.components), 'the state is not normalised');
    return absoluteSquare(g, operators.contract(g, operators.conjugateComponents(g, x), state.components));
  }),
  /** |ψ⟩⟨ψ|/⟨ψ|ψ⟩. */
  projector: operatorOf(({ g }, psi) => {
    const v = asKet(psi);
    const norm = operators.normSquared(g, v);
    return operators.scaleOperator(g, power(g, norm, -1), operators.outer(g, v, operators.conjugateComponents(g, v)));
  }),
  density: operatorOf((c, psi) => densityOf(c, psi)),
  bloch: (c, state) => listValue(bloch(c, densityOf(c, state))),
  /** Tr ρ². */
  purity: scalarOf((c, rho) => {
    const matrix = densityOf(c, rho);
    return operators.trace(c.g, operators.multiplyOperators(c.g, matrix, matrix));
  }),
  entropy: scalarOf((c, rho) => entropy(c, densityOf(c, rho))),
  /** (cos θ/2, e^{iφ} sin θ/2) (Sakurai & Napolitano §3.2). */
  spinor: ({ g }, theta, phi) => {
    const halfAngle = scale(g, HALF, asScalar(theta));
    const phase = exp(g, multiply(g, g.i, asScalar(phi)));
    return ketValue([cos(g, halfAngle), multiply(g, phase, sin(g, halfAngle))]);
  },
  /** e^{−iθ n·σ/2} for a unit vector n (active rotation; Sakurai & Napolitano §3.2). */
  rotation: operatorOf((c, n, theta) => {
    const { g } = c;
    const axis = asList(n);
    requireUnit(
      c,
      sum(
        g,
        axis.map((x) => power(g, x, 2)),
      ),
      'the axis of rotation is not a unit vector',
    );
    const factor = scale(g, rational(-1, 2), multiply(g, g.i, asScalar(theta)));
    return operators.exponentialOfOperator(g, operators.scaleOperator(g, factor, dotSigma(g, axis)));
  }),
  propagator: operatorOf((c, h, t) => propagator(c, asOperator(c.g, h), asScalar(t))),
  /** e^{−iHt/ħ}ψ. */
  evolve: (c, h, t, psi) =>
    ketValue(operators.applyToKet(c.g, propagator(c, asOperator(c.g, h), asScalar(t)), asKet(psi))),
  /** U†AU with U = e^{−iHt/ħ} (Sakurai & Napolitano §2.2). */
  heisenberg: operatorOf((c, a, h, t) => {
    const u = propagator(c, asOperator(c.g, h), asScalar(t));
    const right = operators.multiplyOperators(c.g, asOperator(c.g, a), u);
    return operators.multiplyOperators(c.g, operators.adjoint(c.g, u), right);
  }),
  /** H = −γ B·S = −(γħ/2) B·σ (Larmor 1897; Sakurai & Napolitano §2.1). */
  larmor: operatorOf(({ g, hbar }, gamma, field) => {
    const factor = scale(g, rational(-1, 2), multiply(g, asScalar(gamma), hbar));
    return operators.scaleOperator(g, factor, dotSigma(g, asList(field)));
  }),
  /** (ω1²/Ω²) sin²(Ωt/2), Ω² = ω1² + Δ² (Rabi 1937). */
  rabi: scalarOf(({ g }, omega1, delta, t) => {
    const drive = power(g, asScalar(omega1), 2);
    const square = add(g, drive, power(g, asScalar(delta), 2));
    const phase = scale(g, HALF, multiply(g, squareRoot(g, square), asScalar(t)));
    return multiply(g, divide(g, drive, square), power(g, sin(g, phase), 2));
  }),
  /** e^{−H/k_BT}/Tr e^{−H/k_BT} (Gibbs 1902). */
  thermal: operatorOf(({ g }, h, kT) => {
    const factor = negate(g, power(g, asScalar(kT), -1));
    const weight = operators.exponentialOfOperator(g, operators.scaleOperator(g, factor, asOperator(g, h)));
    return operators.scaleOperator(g, power(g, operators.trace(g, weight), -1), weight);
  }),
};

/**
 * The expressions that reading yields (whole answers are in answer-tree.ts): readonly, plain data, never evaluated or simplified.
 *
 * Every expression carries its span and its value type. Types are consistent in every tree that the parser returns:
 * operands of a sum have one type (a scalar among operators means that multiple of the identity), products and powers
 * are defined, matrix entries are scalar. Signs ± and ∓ occur only in answers of kind `eigenvalues` and `eigenpairs`.
 */
import { type Span } from '../diagnostics';

/**
 * The type of an expression's value.
 * `ket`: two components (column); `bra`: two components (row); `list`: a number of scalars in order;
 * `pairs`: only the reference function eigenpairs.
 */
export type ValueType = 'scalar' | 'operator' | 'ket' | 'bra' | 'list' | 'pairs';

interface Base {
  /** Place in the raw text. Spans of different nodes nest. */
  readonly span: Span;
  readonly type: ValueType;
}

/** A sign before a term. All ± of one answer go together, ∓ is the opposite. */
export type Sign = '+' | '-' | '±' | '∓';

/**
 * A decimal literal with its exact value numerator/denominator (denominator positive, not necessarily in lowest terms:
 * it is a power of ten). `2×10^-3` and `1e-3` are literals; a vulgar fraction is a FractionNode.
 */
export interface NumberNode extends Base {
  readonly node: 'number';
  readonly type: 'scalar';
  readonly numerator: bigint;
  readonly denominator: bigint;
  /** Digits with an optional point, as typed, without the power of ten: `0.50`, `63.87`, `3`. */
  readonly mantissa: string;
  /** The written power of ten, 0 if none. */
  readonly exponent: number;
  /** Whether a decimal point or a negative power of ten was written. */
  readonly decimal: boolean;
  /** Digits written after the point, before the power of ten is applied. */
  readonly decimals: number;
  /** Digits written from the first that is not zero (1 for zero). Trailing zeros count. */
  readonly significantFigures: number;
  /** Whether a power of ten was written (`1e-3`, `2×10^3`). */
  readonly scientific: boolean;
}

/** `planck` is h = 2πħ, `euler` is e alone (its powers are calls of exp). */
export type ConstantName = 'i' | 'pi' | 'hbar' | 'planck' | 'euler';

export interface ConstantNode extends Base {
  readonly node: 'constant';
  readonly type: 'scalar';
  readonly name: ConstantName;
}

/** A declared symbol; `name` is its key in `symbols` (or in `definitions`). */
export interface SymbolNode extends Base {
  readonly node: 'symbol';
  readonly type: 'scalar';
  readonly name: string;
}

/** Brackets that only group, kept so that the reading shows what was typed. Same type as the body. */
export interface GroupNode extends Base {
  readonly node: 'group';
  /** `(` where absent. */
  readonly bracket?: '(' | '[' | '{';
  readonly body: Expression;
}

export interface Term {
  readonly sign: Sign;
  readonly body: Expression;
}

/**
 * One or more signed terms. A single term with sign `-`, `±` or `∓` is a negation or a plus-minus; a sum of one term
 * with `+` does not occur. The sign of the first term is `+` where none is written.
 */
export interface SumNode extends Base {
  readonly node: 'sum';
  readonly terms: readonly Term[];
}

/** How a factor is joined to what stands left of it. `unwritten` and `times` both multiply. */
export type Join = 'times' | 'unwritten' | 'over';

export interface Factor {
  /** The first factor's join is `unwritten` and means nothing. */
  readonly join: Join;
  readonly body: Expression;
}

/**
 * Two or more factors, read from left to right: ((f0 · f1) / f2) · f3. Order matters among operators, kets and bras;
 * what stands after `over` is scalar. `<+|S_x|->` is the product of a bra, an operator and a ket.
 */
export interface ProductNode extends Base {
  readonly node: 'product';
  readonly factors: readonly Factor[];
}

/** A quotient written as one piece: `\frac{a}{b}` or a vulgar fraction. The denominator is scalar. */
export interface FractionNode extends Base {
  readonly node: 'fraction';
  readonly numerator: Expression;
  readonly denominator: Expression;
}

/** `base^exponent`; the exponent is scalar. The base is scalar or an operator. `sin²x` has its mark on the name. */
export interface PowerNode extends Base {
  readonly node: 'power';
  readonly base: Expression;
  readonly exponent: Expression;
  /** `name`: the exponent stands between a function's name and its argument; the base is then that call. */
  readonly placed: 'after' | 'name';
}

/** A root of a scalar; `degree` is 2 unless `\sqrt[n]{…}` says otherwise (an integer from 2 to 99). */
export interface RootNode extends Base {
  readonly node: 'root';
  readonly type: 'scalar';
  readonly radicand: Expression;
  readonly degree: number;
}

/** Functions of one scalar (exp also of an operator), and atan2 of two. `log` is natural. */
export type FunctionName =
  | 'sin'
  | 'cos'
  | 'tan'
  | 'sec'
  | 'csc'
  | 'cot'
  | 'sinh'
  | 'cosh'
  | 'tanh'
  | 'asin'
  | 'acos'
  | 'atan'
  | 'atan2'
  | 'asinh'
  | 'acosh'
  | 'atanh'
  | 'exp'
  | 'ln'
  | 'log'
  | 'Re'
  | 'Im';

/**
 * A function applied to its arguments. `e^x`, `\mathrm{e}^{x}` are calls of exp, written `power`; `sin^-1 x` is a call
 * of asin, written `inverse`. The type is operator for exp of an operator, else scalar.
 */
export interface CallNode extends Base {
  readonly node: 'call';
  readonly type: 'scalar' | 'operator';
  readonly name: FunctionName;
  readonly written: 'name' | 'power' | 'inverse';
  readonly arguments: readonly Expression[];
}

/** |x| or abs(x) of a scalar. */
export interface AbsoluteNode extends Base {
  readonly node: 'absolute';
  readonly type: 'scalar';
  readonly body: Expression;
}

/** Complex conjugate, entry by entry: conj(z), \overline{z}, z^*. Of a scalar, an operator or a ket/bra's components. */
export interface ConjugateNode extends Base {
  readonly node: 'conjugate';
  readonly body: Expression;
}

/** Conjugate transpose; of a ket the bra, of a bra the ket, of a scalar its conjugate. */
export interface AdjointNode extends Base {
  readonly node: 'adjoint';
  readonly body: Expression;
}

/** Transpose of an operator; of a row the column and back. */
export interface TransposeNode extends Base {
  readonly node: 'transpose';
  readonly body: Expression;
}

export type OperatorIndex = 'x' | 'y' | 'z' | '+' | '-';

/** A Pauli matrix σ or a spin operator S = ħσ/2; σ_± = (σ_x ± iσ_y)/2, S_± = S_x ± iS_y. */
export interface OperatorNode extends Base {
  readonly node: 'operator';
  readonly type: 'operator';
  readonly family: 'pauli' | 'spin';
  readonly index: OperatorIndex;
  readonly hat: boolean;
}

export interface IdentityNode extends Base {
  readonly node: 'identity';
  readonly type: 'operator';
  readonly written: 'I' | 'one' | 'sigma';
}

/** A 2×2 matrix, row by row, of scalars. */
export interface MatrixNode extends Base {
  readonly node: 'matrix';
  readonly type: 'operator';
  readonly rows: readonly [readonly [Expression, Expression], readonly [Expression, Expression]];
}

/** Two components one above the other; also `(a, b)`, `[a, b]`, `[a, b]^T` where a state is expected. */
export interface ColumnNode extends Base {
  readonly node: 'column';
  readonly type: 'ket';
  /** Whether it was written side by side, as `(a, b)`, `[a, b]` or `[a, b]^T`. */
  readonly inline?: boolean;
  readonly entries: readonly [Expression, Expression];
}

/** Two components side by side in a matrix of one row. */
export interface RowNode extends Base {
  readonly node: 'row';
  readonly type: 'bra';
  readonly entries: readonly [Expression, Expression];
}

/** The six states known by name; `+z` is |0⟩ = |up⟩ = (1, 0)ᵀ. */
export type StateLabel = '+z' | '-z' | '+x' | '-x' | '+y' | '-y';

/** How a state's label was written. */
export type WrittenLabel = StateLabel | '+' | '-' | '0' | '1' | 'up' | 'down' | '↑' | '↓';

export interface KetNode extends Base {
  readonly node: 'ket';
  readonly type: 'ket';
  readonly state: StateLabel;
  readonly written: WrittenLabel;
}

export interface BraNode extends Base {
  readonly node: 'bra';
  readonly type: 'bra';
  readonly state: StateLabel;
  readonly written: WrittenLabel;
}

/** [left, right] with at least one operator; a scalar means that multiple of the identity. */
export interface CommutatorNode extends Base {
  readonly node: 'commutator';
  readonly type: 'operator';
  readonly left: Expression;
  readonly right: Expression;
}

/** {left, right} with at least one operator. */
export interface AnticommutatorNode extends Base {
  readonly node: 'anticommutator';
  readonly type: 'operator';
  readonly left: Expression;
  readonly right: Expression;
}

/** Scalars in order: `(a, b, c)`, `[a, b, c]`, a column of three, or `a, b, c` without brackets. */
export interface ListNode extends Base {
  readonly node: 'list';
  readonly type: 'list';
  readonly bracket: '(' | '[' | '{' | 'column' | 'none';
  readonly entries: readonly Expression[];
}

/** Functions for references only; read only where `allowReferenceFunctions` is set. */
export type ReferenceName =
  | 'commutator'
  | 'anticommutator'
  | 'eigenvalues'
  | 'eigenpairs'
  | 'trace'
  | 'determinant'
  | 'adjoint'
  | 'pauli'
  | 'expectation'
  | 'variance'
  | 'uncertainty'
  | 'probability'
  | 'projector'
  | 'density'
  | 'bloch'
  | 'purity'
  | 'entropy'
  | 'spinor'
  | 'rotation'
  | 'propagator'
  | 'evolve'
  | 'heisenberg'
  | 'larmor'
  | 'rabi'
  | 'thermal';

/** A reference function applied to arguments whose number and types have been checked (notation/reference-functions). */
export interface ReferenceNode extends Base {
  readonly node: 'reference';
  readonly name: ReferenceName;
  readonly arguments: readonly Expression[];
}

export type Expression =
  | NumberNode
  | ConstantNode
  | SymbolNode
  | GroupNode
  | SumNode
  | ProductNode
  | FractionNode
  | PowerNode
  | RootNode
  | CallNode
  | AbsoluteNode
  | ConjugateNode
  | AdjointNode
  | TransposeNode
  | OperatorNode
  | IdentityNode
  | MatrixNode
  | ColumnNode
  | RowNode
  | KetNode
  | BraNode
  | CommutatorNode
  | AnticommutatorNode
  | ListNode
  | ReferenceNode;

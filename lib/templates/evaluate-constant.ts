import { type CallNode, type Expression } from '@/lib/checker/notation/tree';

/** A complex number in double precision. */
export interface Complex {
  readonly re: number;
  readonly im: number;
}

/**
 * The value of a scalar constant expression in double precision, with ħ = 1; null where it has a symbol, an operator, a
 * state or a reference function in it, or is not a finite number. It orders drawn values; equality is decided exactly
 * elsewhere.
 */
export function evaluateConstant(tree: Expression): Complex | null {
  const value = evaluate(tree);
  return value !== null && Number.isFinite(value.re) && Number.isFinite(value.im) ? value : null;
}

function evaluate(tree: Expression): Complex | null {
  switch (tree.node) {
    case 'number':
      return real(Number(tree.numerator) / Number(tree.denominator));
    case 'constant':
      return constants[tree.name];
    case 'group':
      return evaluate(tree.body);
    case 'sum':
      return fold(tree.terms, real(0), (sum, term) => {
        const value = evaluate(term.body);
        if (value === null || (term.sign !== '+' && term.sign !== '-')) return null;
        return term.sign === '+' ? add(sum, value) : add(sum, scale(value, -1));
      });
    case 'product':
      return fold(tree.factors, real(1), (product, factor) => {
        const value = evaluate(factor.body);
        if (value === null) return null;
        return factor.join === 'over' ? divide(product, value) : multiply(product, value);
      });
    case 'fraction':
      return both(tree.numerator, tree.denominator, divide);
    case 'power':
      return both(tree.base, tree.exponent, power);
    case 'root':
      return apply(tree.radicand, (value) => power(value, real(1 / tree.degree)));
    case 'absolute':
      return apply(tree.body, (value) => real(Math.hypot(value.re, value.im)));
    case 'conjugate':
      return tree.type === 'scalar' ? apply(tree.body, conjugate) : null;
    case 'adjoint':
      return tree.type === 'scalar' ? apply(tree.body, conjugate) : null;
    case 'call':
      return call(tree);
    default:
      return null;
  }
}

const constants = {
  i: { re: 0, im: 1 },
  pi: { re: Math.PI, im: 0 },
  hbar: { re: 1, im: 0 },
  planck: { re: 2 * Math.PI, im: 0 },
  euler: { re: Math.E, im: 0 },
} satisfies Record<string, Complex>;

/** Functions of one real argument; outside the reals only exp, Re, Im are needed of a drawn value. */
const realFunctions: Partial<Record<CallNode['name'], (x: number) => number>> = {
  sin: Math.sin,
  cos: Math.cos,
  tan: Math.tan,
  sec: (x) => 1 / Math.cos(x),
  csc: (x) => 1 / Math.sin(x),
  cot: (x) => 1 / Math.tan(x),
  sinh: Math.sinh,
  cosh: Math.cosh,
  tanh: Math.tanh,
  asin: Math.asin,
  acos: Math.acos,
  atan: Math.atan,
  asinh: Math.asinh,
  acosh: Math.acosh,
  atanh: Math.atanh,
  ln: Math.log,
  log: Math.log,
};

function call(tree: CallNode): Complex | null {
  const values = tree.arguments.map(evaluate);
  const [first, second] = values;
  if (!first || tree.type !== 'scalar') return null;
  switch (tree.name) {
    case 'exp':
      return polar(Math.exp(first.re), first.im);
    case 'Re':
      return real(first.re);
    case 'Im':
      return real(first.im);
    case 'atan2':
      return second && first.im === 0 && second.im === 0 ? real(Math.atan2(first.re, second.re)) : null;
    default: {
      const compute = realFunctions[tree.name];
      return compute !== undefined && first.im === 0 ? real(compute(first.re)) : null;
    }
  }
}

function real(value: number): Complex {
  return { re: value, im: 0 };
}

function polar(length: number, angle: number): Complex {
  return angle === 0 ? real(length) : { re: length * Math.cos(angle), im: length * Math.sin(angle) };
}

function add(a: Complex, b: Complex): Complex {
  return { re: a.re + b.re, im: a.im + b.im };
}

function scale(a: Complex, factor: number): Complex {
  return { re: a.re * factor, im: a.im * factor };
}

function conjugate(a: Complex): Complex {
  return { re: a.re, im: -a.im };
}

function multiply(a: Complex, b: Complex): Complex {
  return { re: a.re * b.re - a.im * b.im, im: a.re * b.im + a.im * b.re };
}

function divide(a: Complex, b: Complex): Complex {
  return scale(multiply(a, conjugate(b)), 1 / (b.re * b.re + b.im * b.im));
}

/** The principal value of a power; a whole power of a real number stays real. */
function power(base: Complex, exponent: Complex): Complex {
  if (exponent.im === 0 && base.im === 0 && (base.re >= 0 || Number.isInteger(exponent.re))) {
    return real(base.re ** exponent.re);
  }
  const length = Math.hypot(base.re, base.im);
  if (length === 0) return real(0);
  const angle = Math.atan2(base.im, base.re);
  const logarithm = Math.log(length);
  return polar(Math.exp(exponent.re * logarithm - exponent.im * angle), exponent.im * logarithm + exponent.re * angle);
}

function apply(tree: Expression, compute: (value: Complex) => Complex): Complex | null {
  const value = evaluate(tree);
  return value === null ? null : compute(value);
}

function both(left: Expression, right: Expression, compute: (a: Complex, b: Complex) => Complex): Complex | null {
  const [a, b] = [evaluate(left), evaluate(right)];
  return a === null || b === null ? null : compute(a, b);
}

function fold<Part>(
  parts: readonly Part[],
  start: Complex,
  step: (sum: Complex, part: Part) => Complex | null,
): Complex | null {
  return parts.reduce<Complex | null>((sum, part) => (sum === null ? null : step(sum, part)), start);
}

import { Decimal } from 'decimal.js';

/** Decimals whose precision the caller sets before each evaluation. */
export const D = Decimal.clone({ precision: 60, defaults: true });
export type Real = InstanceType<typeof D>;

/** A complex number of as many figures. */
export interface Complex {
  readonly re: Real;
  readonly im: Real;
}

export const ZERO_REAL = new D(0);
export const piReal = (): Real => D.acos(-1);

export const complex = (re: Real, im: Real = ZERO_REAL): Complex => ({ re, im });

export const plus = (x: Complex, y: Complex): Complex => ({ re: x.re.plus(y.re), im: x.im.plus(y.im) });

export function times(x: Complex, y: Complex): Complex {
  if (x.im.isZero() && y.im.isZero()) return complex(x.re.times(y.re));
  return {
    re: x.re.times(y.re).minus(x.im.times(y.im)),
    im: x.re.times(y.im).plus(x.im.times(y.re)),
  };
}

export function inverse(x: Complex): Complex {
  const square = x.re.times(x.re).plus(x.im.times(x.im));
  return { re: x.re.div(square), im: x.im.neg().div(square) };
}

export const size = (x: Complex): Real => (x.im.isZero() ? x.re.abs() : D.hypot(x.re, x.im));

export function integerPower(x: Complex, n: number): Complex {
  let base = n < 0 ? inverse(x) : x;
  let result = complex(new D(1));
  for (let k = Math.abs(n); k > 0; k = Math.floor(k / 2)) {
    if (k % 2 === 1) result = times(result, base);
    base = times(base, base);
  }
  return result;
}

/** Principal q-th root. */
export function principalRoot(x: Complex, q: number): Complex {
  if (x.im.isZero() && !x.re.isNegative()) return complex(q === 2 ? x.re.sqrt() : x.re.pow(new D(1).div(q)));
  if (x.im.isZero() && q === 2) return { re: ZERO_REAL, im: x.re.neg().sqrt() };
  const scale = q === 2 ? size(x).sqrt() : size(x).pow(new D(1).div(q));
  const angle = angleOf(x).div(q);
  return { re: scale.times(angle.cos()), im: scale.times(angle.sin()) };
}

export const angleOf = (x: Complex): Real => D.atan2(x.im, x.re);

export const logarithm = (x: Complex): Complex => ({
  re: size(x).ln(),
  im: x.im.isZero() ? (x.re.isNegative() ? piReal() : ZERO_REAL) : angleOf(x),
});

export function exponential(x: Complex): Complex {
  const scale = x.re.exp();
  if (x.im.isZero()) return complex(scale);
  return { re: scale.times(x.im.cos()), im: scale.times(x.im.sin()) };
}

/** (e^{ix} + e^{−ix})/2 and (e^{ix} − e^{−ix})/2i. */
export function cosine(x: Complex): Complex {
  if (x.im.isZero()) return complex(x.re.cos());
  return { re: x.re.cos().times(x.im.cosh()), im: x.re.sin().times(x.im.sinh()).neg() };
}

export function sine(x: Complex): Complex {
  if (x.im.isZero()) return complex(x.re.sin());
  return { re: x.re.sin().times(x.im.cosh()), im: x.re.cos().times(x.im.sinh()) };
}

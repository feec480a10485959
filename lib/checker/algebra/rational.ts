/**
 * Exact rational numbers: small ones as pairs of safe integers, large ones as pairs of bigints.
 * Always in lowest terms with a positive denominator, so equal values have equal fields.
 */
export type Rational =
  | { readonly n: number; readonly d: number; readonly big: false }
  | { readonly n: bigint; readonly d: bigint; readonly big: true };

const SAFE = Number.MAX_SAFE_INTEGER;

export const ZERO: Rational = { n: 0, d: 1, big: false };
export const ONE: Rational = { n: 1, d: 1, big: false };
export const MINUS_ONE: Rational = { n: -1, d: 1, big: false };
export const TWO: Rational = { n: 2, d: 1, big: false };
export const HALF: Rational = { n: 1, d: 2, big: false };

/** The rational n/d of two safe integers, d ≠ 0. */
export function rational(n: number, d = 1): Rational {
  if (d === 1) return { n: n + 0, d: 1, big: false };
  const g = gcd(Math.abs(n), Math.abs(d)) * (d < 0 ? -1 : 1);
  return { n: n / g + 0, d: d / g, big: false };
}

/** The rational n/d of two bigints, d ≠ 0. */
export function bigRational(n: bigint, d: bigint): Rational {
  const g = bigGcd(n < 0n ? -n : n, d < 0n ? -d : d) * (d < 0n ? -1n : 1n);
  return shrink(n / g, d / g);
}

/** Exact value of a decimal literal such as `12.50e-3`; null if its exponent is beyond ±400. */
export function rationalFromDecimal(text: string): Rational | null {
  const match = /^(\d*)(?:\.(\d*))?(?:[eE]([+-]?\d+))?$/.exec(text);
  if (!match) return null;
  const whole = match[1] ?? '';
  const fraction = match[2] ?? '';
  const exponent = Number(match[3] ?? '0') - fraction.length;
  if (whole.length + fraction.length === 0 || Math.abs(exponent) > 4400) return null;
  if (Number(match[3] ?? '0') > 400 || Number(match[3] ?? '0') < -400) return null;
  const digits = whole + fraction;
  if (digits.length < 15 && exponent > -15 && exponent <= 0) return rational(Number(digits), 10 ** -exponent);
  const n = BigInt(digits);
  return exponent >= 0 ? bigRational(n * 10n ** BigInt(exponent), 1n) : bigRational(n, 10n ** BigInt(-exponent));
}

export function addRational(a: Rational, b: Rational): Rational {
  if (!a.big && !b.big) {
    if (a.d === 1 && b.d === 1) {
      const sum = a.n + b.n;
      if (Math.abs(sum) <= SAFE) return { n: sum, d: 1, big: false };
    } else {
      const x = a.n * b.d;
      const y = b.n * a.d;
      const d = a.d * b.d;
      if (Math.abs(x) <= SAFE && Math.abs(y) <= SAFE && d <= SAFE && Math.abs(x + y) <= SAFE) return rational(x + y, d);
    }
  }
  return bigRational(BigInt(a.n) * BigInt(b.d) + BigInt(b.n) * BigInt(a.d), BigInt(a.d) * BigInt(b.d));
}

export function multiplyRational(a: Rational, b: Rational): Rational {
  if (!a.big && !b.big) {
    const n = a.n * b.n;
    const d = a.d * b.d;
    if (Math.abs(n) <= SAFE && d <= SAFE) return rational(n, d);
  }
  return bigRational(BigInt(a.n) * BigInt(b.n), BigInt(a.d) * BigInt(b.d));
}

export function negateRational(a: Rational): Rational {
  return a.big ? { n: -a.n, d: a.d, big: true } : { n: 0 - a.n, d: a.d, big: false };
}

export const subtractRational = (a: Rational, b: Rational): Rational => addRational(a, negateRational(b));

/** 1/a for a ≠ 0. */
export function invertRational(a: Rational): Rational {
  if (a.big) return a.n < 0n ? { n: -a.d, d: -a.n, big: true } : { n: a.d, d: a.n, big: true };
  return a.n < 0 ? { n: -a.d, d: -a.n, big: false } : { n: a.d, d: a.n, big: false };
}

/** a to an integer power; null when the result would have more than about 6000 bits. */
export function powerRational(a: Rational, exponent: number): Rational | null {
  if (exponent < 0) return isZero(a) ? null : powerRational(invertRational(a), -exponent);
  if (!a.big && a.d === 1 && (a.n === 1 || a.n === 0)) return exponent === 0 ? ONE : a;
  if (!a.big && a.d === 1 && a.n === -1) return exponent % 2 === 0 ? ONE : a;
  if (exponent === 2) return multiplyRational(a, a);
  if (bitLength(a) * exponent > 6000) return null;
  return bigRational(BigInt(a.n) ** BigInt(exponent), BigInt(a.d) ** BigInt(exponent));
}

/** Upper bound on the number of bits of numerator and denominator. */
export function bitLength(a: Rational): number {
  if (!a.big) return Math.max(Math.ceil(Math.log2(Math.abs(a.n) + 1)), Math.ceil(Math.log2(a.d + 1)));
  const n = (a.n < 0n ? -a.n : a.n).toString(16).length;
  return 4 * Math.max(n, a.d.toString(16).length);
}

/** Nearest double (correct to a few units in the last place). */
export function toNumber(a: Rational): number {
  if (!a.big) return a.n / a.d;
  const shift = Math.max(bitLength(a) - 1000, 0);
  if (shift === 0) return Number(a.n) / Number(a.d);
  const negative = a.n < 0n;
  const scaled = ((negative ? -a.n : a.n) << 80n) / a.d;
  const value = scaled === 0n ? 0 : Number(scaled) / 2 ** 80;
  return negative ? -value : value;
}

export const isZero = (a: Rational): boolean => (a.big ? a.n === 0n : a.n === 0);
export const isOne = (a: Rational): boolean => !a.big && a.n === 1 && a.d === 1;
export const isInteger = (a: Rational): boolean => (a.big ? a.d === 1n : a.d === 1);
export const isNegative = (a: Rational): boolean => (a.big ? a.n < 0n : a.n < 0);
export const equalRational = (a: Rational, b: Rational): boolean => a.n === b.n && a.d === b.d;

/** Sign of a − b. */
export const compareRational = (a: Rational, b: Rational): number => {
  const difference = subtractRational(a, b);
  return isZero(difference) ? 0 : isNegative(difference) ? -1 : 1;
};

/** Key of a value, equal for equal values. */
export const rationalKey = (a: Rational): string => (isInteger(a) ? `${a.n}` : `${a.n}/${a.d}`);

/** Remainder of a non-negative integer division, as a rational in [0, m). */
export function moduloRational(a: Rational, m: number): Rational {
  if (!a.big) {
    const period = m * a.d;
    if (period <= SAFE) return rational(((a.n % period) + period) % period, a.d);
  }
  const period = BigInt(m) * BigInt(a.d);
  return bigRational(((BigInt(a.n) % period) + period) % period, BigInt(a.d));
}

export function gcd(a: number, b: number): number {
  while (b !== 0) {
    const r = a % b;
    a = b;
    b = r;
  }
  return a;
}

export function bigGcd(a: bigint, b: bigint): bigint {
  while (b !== 0n) {
    const r = a % b;
    a = b;
    b = r;
  }
  return a;
}

function shrink(n: bigint, d: bigint): Rational {
  const small = BigInt(SAFE);
  if (n <= small && n >= -small && d <= small) return { n: Number(n), d: Number(d), big: false };
  return { n, d, big: true };
}

/**
 * Arithmetic modulo primes below 2^26, in doubles: a product stays below 2^52 and is exact.
 *
 * Every prime is 1 modulo 10080 = 2⁵·3²·5·7 and has 11, 13 and 17 as squares, so that i, √2, √3, √5, √7, √11, √13, √17 and
 * e^{iπq} for every q with denominator dividing 5040 exist in the field; `zeta` is an element of order 10080, and the
 * roots are taken from it, so that i, √2, cos(π/8), … keep their relations to each other.
 */
export const ROOT_ORDER = 10080;

const TABLE: readonly (readonly [number, number])[] = [
  [66860641, 36361065],
  [66507841, 483910],
  [66144961, 2164717],
  [65509921, 992350],
  [64975681, 29699306],
  [64764001, 11145388],
  [64108801, 62086372],
  [63423361, 31657927],
  [63262081, 37378741],
  [62768161, 29210162],
  [62737921, 13085953],
  [62707681, 27517212],
  [62375041, 15064064],
  [61961761, 56526615],
  [61881121, 12252169],
  [61709761, 53068075],
  [61659361, 58205585],
  [61447681, 54603404],
  [61316641, 42857704],
  [61225921, 54103760],
  [61004161, 36780406],
  [60661441, 45442134],
  [60651361, 59804082],
  [60540481, 44462223],
  [60520321, 57974464],
  [59824801, 23148212],
  [59653441, 34690727],
  [59492161, 34001667],
  [59209921, 2000872],
  [58433761, 2389309],
  [58080961, 36346636],
  [57335041, 26684328],
];

/** No prime of the table is below this. */
export const LEAST_PRIME = 57335041;

export class PrimeField {
  readonly p: number;
  private readonly inverse: number;
  readonly i: number;
  private readonly knownRoots = new Map<number, number | null>();

  constructor(
    p: number,
    readonly zeta: number,
  ) {
    this.p = p;
    this.inverse = 1 / p;
    this.i = this.power(zeta, ROOT_ORDER / 4);
    const cosine2 = (k: number): number => {
      const turn = this.power(zeta, k);
      return this.add(turn, this.invert(turn));
    };
    // √2 = 2cos(π/4), √3 = 2cos(π/6), √5 = 1 + 4cos(2π/5), and √7 from its quadratic Gauss sum i√7 (Gauss 1811).
    this.knownRoots.set(2, cosine2(ROOT_ORDER / 8));
    this.knownRoots.set(3, cosine2(ROOT_ORDER / 12));
    this.knownRoots.set(5, this.add(1, this.multiply(2, cosine2(ROOT_ORDER / 5))));
    let gauss = 0;
    for (let k = 0; k < 7; k++) gauss = this.add(gauss, this.power(zeta, (ROOT_ORDER / 7) * ((k * k) % 7)));
    this.knownRoots.set(7, this.multiply(this.negate(this.i), gauss));
  }

  add(x: number, y: number): number {
    const s = x + y;
    return s >= this.p ? s - this.p : s;
  }

  negate(x: number): number {
    return x === 0 ? 0 : this.p - x;
  }

  multiply(x: number, y: number): number {
    const product = x * y;
    const r = product - Math.floor(product * this.inverse) * this.p;
    return r < 0 ? r + this.p : r >= this.p ? r - this.p : r;
  }

  /** xⁿ for any integer n; x must not be 0 where n is negative. */
  power(x: number, n: number): number {
    if (n < 0) return this.power(this.invert(x), -n);
    let result = 1;
    let base = x;
    for (let k = n; k > 0; k = Math.floor(k / 2)) {
      if (k % 2 === 1) result = this.multiply(result, base);
      base = this.multiply(base, base);
    }
    return result;
  }

  /** 1/x for x ≠ 0, by Euclid's algorithm. */
  invert(x: number): number {
    let r0 = this.p | 0;
    let r1 = x | 0;
    let t0 = 0;
    let t1 = 1;
    while (r1 !== 0) {
      const q = (r0 / r1) | 0;
      const r = (r0 - q * r1) | 0;
      r0 = r1;
      r1 = r;
      const t = (t0 - q * t1) | 0;
      t0 = t1;
      t1 = t;
    }
    return t0 < 0 ? t0 + this.p : t0;
  }

  fromInteger(n: number): number {
    const r = n % this.p;
    return r < 0 ? r + this.p : r + 0;
  }

  fromBigInt(n: bigint): number {
    const r = Number(n % BigInt(this.p));
    return r < 0 ? r + this.p : r;
  }

  /** A fixed q-th root of the positive integer n, consistent with zeta; null where the field has none. */
  rootOfInteger(n: number, q: number): number | null {
    if (q % 2 === 0) {
      let square = this.knownRoots.get(n);
      if (square === undefined) {
        square = this.root(this.fromInteger(n), 2);
        this.knownRoots.set(n, square);
      }
      return square === null || q === 2 ? square : this.root(square, q / 2);
    }
    return this.root(this.fromInteger(n), q);
  }

  /** Some q-th root of x, or null where there is none. */
  root(x: number, q: number): number | null {
    if (x === 0) return 0;
    let value: number | null = x;
    let rest = q;
    for (let prime = 2; rest > 1 && value !== null; prime++) {
      while (rest % prime === 0 && value !== null) {
        value = this.primeRoot(value, prime);
        rest /= prime;
      }
    }
    return value;
  }

  /** Root of prime order q: Tonelli 1891 for q = 2, Adleman, Manders and Miller 1977 for the rest. */
  private primeRoot(x: number, q: number): number | null {
    const order = this.p - 1;
    if (order % q !== 0) return this.power(x, inverseModulo(q, order));
    if (this.power(x, order / q) !== 1) return null;
    let t = order;
    let s = 0;
    while (t % q === 0) {
      t /= q;
      s++;
    }
    // u·q ≡ 1 (mod t): x^u is a root up to an element of order q^(s−1).
    const u = inverseModulo(q, t);
    const generator = this.power(this.nonResidue(q), t);
    let candidate = this.power(x, u);
    // Error e = x / candidate^q lies in the group of order q^s and is a q-th power there; find its root digit by digit.
    let error = this.multiply(x, this.invert(this.power(candidate, q)));
    const top = this.power(generator, q ** (s - 1));
    for (let level = 1; level < s; level++) {
      const digit = this.power(error, q ** (s - 1 - level));
      if (digit === 1) continue;
      let k = 0;
      for (let probe = 1; probe !== digit; probe = this.multiply(probe, top)) k++;
      const step = this.power(generator, k * q ** (level - 1));
      candidate = this.multiply(candidate, step);
      error = this.multiply(error, this.invert(this.power(step, q)));
    }
    return candidate;
  }

  private readonly nonResidues = new Map<number, number>();

  private nonResidue(q: number): number {
    let known = this.nonResidues.get(q);
    if (known === undefined) {
      known = 2;
      while (this.power(known, (this.p - 1) / q) === 1) known++;
      this.nonResidues.set(q, known);
    }
    return known;
  }
}

/** The fields, built once when first asked for; constants only. */
const fields: PrimeField[] = [];

export const FIELD_COUNT = TABLE.length;

export function primeField(index: number): PrimeField {
  const known = fields[index];
  if (known) return known;
  const [p, zeta] = TABLE[index]!;
  const field = new PrimeField(p, zeta);
  fields[index] = field;
  return field;
}

function inverseModulo(a: number, m: number): number {
  let r0 = m;
  let r1 = a % m;
  let t0 = 0;
  let t1 = 1;
  while (r1 !== 0) {
    const q = Math.floor(r0 / r1);
    [r0, r1] = [r1, r0 - q * r1];
    [t0, t1] = [t1, t0 - q * t1];
  }
  return t0 < 0 ? t0 + m : t0;
}

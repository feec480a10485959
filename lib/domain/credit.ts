/**
 * Credit is counted in whole thousandths of a mark, so that sums are exact; it is rounded once, at the part, half away
 * from zero.
 */
export type Thousandths = number;

const MAX_CREDIT: Thousandths = 1_000_000_000;

/** Whether a number is a credit that may be stored: a whole number of thousandths from 0 to one million marks. */
export function isCredit(value: number): value is Thousandths {
  return Number.isInteger(value) && value >= 0 && value <= MAX_CREDIT;
}

/**
 * The share `numerator/denominator` of a credit, rounded half away from zero to whole thousandths.
 * Throws a RangeError for a denominator that is not a positive integer or parts that are not integers.
 */
export function shareOfCredit(outOf: Thousandths, numerator: number, denominator: number): Thousandths {
  if (!Number.isSafeInteger(outOf) || !Number.isSafeInteger(numerator) || !Number.isSafeInteger(denominator)) {
    throw new RangeError('Credit shares are made of whole numbers.');
  }
  if (denominator <= 0) throw new RangeError('The denominator of a credit share is positive.');
  const product = BigInt(outOf) * BigInt(numerator);
  const magnitude = product < 0n ? -product : product;
  const divisor = BigInt(denominator);
  const rounded = (2n * magnitude + divisor) / (2n * divisor);
  return Number(product < 0n ? -rounded : rounded);
}

/** Writes a credit as marks: 3000 is "3", 2500 is "2.5", 333 is "0.333". */
export function formatCredit(credit: Thousandths): string {
  const sign = credit < 0 ? '−' : '';
  const magnitude = Math.abs(credit);
  const whole = Math.floor(magnitude / 1000);
  const rest = String(magnitude % 1000)
    .padStart(3, '0')
    .replace(/0+$/, '');
  return rest === '' ? `${sign}${whole}` : `${sign}${whole}.${rest}`;
}

/**
 * Reads marks typed by a person ("3", "2.5", "0.333", with a point) as thousandths; null when it is not a number of
 * marks with at most three decimals.
 */
export function parseCredit(text: string): Thousandths | null {
  const match = /^\s*(\d{1,6})(?:\.(\d{1,3}))?\s*$/.exec(text);
  if (!match) return null;
  const credit = Number(match[1]) * 1000 + Number((match[2] ?? '').padEnd(3, '0') || '0');
  return isCredit(credit) ? credit : null;
}

/** The sum of credits; exact, since they are whole numbers. */
export function sumCredits(credits: readonly Thousandths[]): Thousandths {
  return credits.reduce((sum, credit) => sum + credit, 0);
}

/**
 * Divides the points of an item over its parts in proportion to their weights, each rounded half away from zero once;
 * what rounding left over or took too much goes to the last part with a weight, so the parts always add up to the item.
 * Throws a RangeError when no weight is positive.
 */
export function dividePoints(points: Thousandths, weights: readonly number[]): Thousandths[] {
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  if (total <= 0 || weights.some((weight) => weight < 0))
    throw new RangeError('Part weights add up to more than zero.');
  const parts = weights.map((weight) => shareOfCredit(points, weight, total));
  const last = weights.findLastIndex((weight) => weight > 0);
  return parts.map((part, index) => (index === last ? part + points - sumCredits(parts) : part));
}

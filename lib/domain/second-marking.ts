import type { Thousandths } from './credit';

/**
 * Whether two credits of the same answer differ by more than a tolerance, which is a share of the part's full credit in
 * thousandths. Both sides are whole numbers, so the comparison is exact.
 */
export function differBeyondTolerance(
  first: Thousandths,
  second: Thousandths,
  outOf: Thousandths,
  tolerance: number,
): boolean {
  return Math.abs(first - second) * 1000 > tolerance * outOf;
}

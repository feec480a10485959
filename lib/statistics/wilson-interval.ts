import { Z_95, type Interval } from './normal';

/**
 * The 95 % score interval of a proportion without continuity correction: sound for small numbers and near 0 and 1.
 * Source: E. B. Wilson, J. Am. Stat. Assoc. 22 (1927) 209; method 3 of R. G. Newcombe, Stat. Med. 17 (1998) 857.
 *
 * @param successes whole number from 0 to `total`
 * @returns null where `total` is 0: there is nothing to estimate
 */
export function wilsonInterval(successes: number, total: number): Interval | null {
  if (total === 0) return null;
  if (!Number.isInteger(successes) || !Number.isInteger(total) || successes < 0 || successes > total) {
    throw new RangeError('A proportion is a whole number of successes out of a whole number of trials.');
  }
  const z2 = Z_95 * Z_95;
  const centre = 2 * successes + z2;
  const spread = Z_95 * Math.sqrt(z2 + (4 * successes * (total - successes)) / total);
  const scale = 2 * (total + z2);
  return {
    lower: successes === 0 ? 0 : (centre - spread) / scale,
    upper: successes === total ? 1 : (centre + spread) / scale,
  };
}

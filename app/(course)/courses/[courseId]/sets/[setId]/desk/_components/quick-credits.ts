import { formatCredit, shareOfCredit, type Thousandths } from '@/lib/domain/credit';

/** A credit that one key gives. */
export type QuickCredit = { key: string; credit: Thousandths; words: string };

/**
 * The credits that have a key of their own: every whole mark where the part has at most nine of them, else none, a
 * quarter, a half, three quarters and all, on the keys 0 to 4.
 */
export function quickCredits(outOf: Thousandths): QuickCredit[] {
  const whole = outOf % 1000 === 0 && outOf <= 9000;
  const credits = whole
    ? Array.from({ length: outOf / 1000 + 1 }, (_, marks) => marks * 1000)
    : [0, 1, 2, 3, 4].map((quarters) => shareOfCredit(outOf, quarters, 4));
  return credits.map((credit, index) => ({ key: String(index), credit, words: formatCredit(credit) }));
}

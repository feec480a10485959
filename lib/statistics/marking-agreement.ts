import { cohenKappa, type Kappa } from './cohen-kappa';
import { contingencyTable } from './contingency-table';
import { type Interval } from './normal';
import { wilsonInterval } from './wilson-interval';

/** Two markings of one answer: whole thousandths of a mark, and the full credit they are out of (above zero). */
export type MarkedTwice = { readonly one: number; readonly other: number; readonly outOf: number };

/** How far a number of pairs carries a figure. */
export type Weight = 'nothing' | 'very few' | 'few' | 'enough';

/** Agreement of two markings: figures with what they rest on. Shares lie between 0 and 1. */
export type MarkingAgreement = {
  pairs: number;
  /** Pairs with exactly the same credit. */
  same: number;
  /** Share of `same` with its 95 % score interval; null without pairs. */
  agreement: { share: number; interval: Interval } | null;
  kappa: Kappa;
  /** Whether kappa's large-sample interval means anything: it shrinks to a point where all pairs agree or few are there. */
  kappaIntervalHolds: boolean;
  /** Mean of `one` − `other` as a share of the full credit: who marks more kindly; null without pairs. */
  meanDifference: number | null;
  weight: Weight;
};

/** Below this many pairs a figure is an anecdote: its 95 % interval is wider than half the scale. */
const veryFew = 12;
/** Below this many the large-sample error of kappa is a rough guide (common practice asks for about thirty pairs). */
const few = 30;

/**
 * The agreement of two markings of the same answers. The categories of kappa are the distinct shares of the full credit
 * that either gave, so that its observed agreement is the share of equal credits.
 */
export function markingAgreement(pairs: readonly MarkedTwice[]): MarkingAgreement {
  const shares = pairs.map(({ one, other, outOf }) => [one / outOf, other / outOf] as const);
  const same = pairs.filter(({ one, other }) => one === other).length;
  const kappa = cohenKappa(contingencyTable(shares, [...new Set(shares.flat())]));
  const interval = wilsonInterval(same, pairs.length);
  return {
    pairs: pairs.length,
    same,
    agreement: interval === null ? null : { share: same / pairs.length, interval },
    kappa,
    kappaIntervalHolds: kappa.defined && kappa.standardError > 0 && pairs.length >= veryFew,
    meanDifference:
      pairs.length === 0 ? null : shares.reduce((sum, [one, other]) => sum + one - other, 0) / pairs.length,
    weight: weightOf(pairs.length),
  };
}

function weightOf(pairs: number): Weight {
  if (pairs === 0) return 'nothing';
  if (pairs < veryFew) return 'very few';
  return pairs < few ? 'few' : 'enough';
}

import { formatCredit } from '@/lib/domain/credit';
import { differBeyondTolerance } from '@/lib/domain/second-marking';
import { type PairOfMarkings } from '@/lib/queries/second-markings-of-set';
import { markingAgreement, type MarkedTwice, type MarkingAgreement } from '@/lib/statistics/marking-agreement';

/** The figures of two graders, or of all markings; `name` is what the row is called. */
export type ConsistencyRow = {
  id: string;
  name: string;
  agreement: MarkingAgreement;
  /** Pairs that lie apart by more than the set's tolerance. */
  apart: number;
};

/** Two markings that wait to be settled. */
export type ToSettle = { secondMarkingId: string; where: string; credits: string };

/** What a consistency page shows. */
export type Consistency = { overall: ConsistencyRow; rows: ConsistencyRow[]; toSettle: ToSettle[] };

/**
 * Turns pairs of markings into figures, overall and for each two graders, most pairs first. For a TA (`ownOnly`) the
 * other graders have numbers in place of names, and every difference is the TA's credit less the other's.
 *
 * @param tolerance the set's, in thousandths of a part's full credit
 */
export function presentConsistency(
  pairs: readonly PairOfMarkings[],
  { ownOnly, tolerance }: { ownOnly: string | null; tolerance: number },
): Consistency {
  const turned = pairs.map((pair) => turn(pair, ownOnly));
  const largestFirst = byGraders(turned).sort((a, b) => b.length - a.length);
  const rows = largestFirst.map((group, index) => {
    const [{ one, other } = { one: noGrader, other: noGrader }] = group;
    const name = ownOnly === null ? `${one.name} and ${other.name}` : `You and co-marker ${index + 1}`;
    return rowOf(`pair-${index + 1}`, name, group, tolerance);
  });
  const asMarked = ownOnly === null ? pairs.map((pair) => oriented(pair, false)) : turned;
  return {
    overall: rowOf('overall', ownOnly === null ? 'All markings' : 'All your pairs', asMarked, tolerance),
    rows,
    toSettle: ownOnly === null ? pairs.filter(({ state }) => state === 'to-settle').map(presentToSettle) : [],
  };
}

type Grader = { id: string; name: string };
type Oriented = { one: Grader; other: Grader; credits: MarkedTwice };

const noGrader: Grader = { id: '', name: '' };

/** The pair in an order that is the same for the same two people, whoever marked first; one's own side comes first. */
function turn(pair: PairOfMarkings, ownOnly: string | null): Oriented {
  const ownIsSecond = pair.secondGraderId === ownOnly;
  const bySortedId = ownOnly === null && pair.secondGraderId < pair.firstGraderId;
  return oriented(pair, ownIsSecond || bySortedId);
}

function oriented(pair: PairOfMarkings, swapped: boolean): Oriented {
  const first = { id: pair.firstGraderId, name: pair.firstGraderName };
  const second = { id: pair.secondGraderId, name: pair.secondGraderName };
  const { firstCredit, secondCredit, outOf } = pair;
  return swapped
    ? { one: second, other: first, credits: { one: secondCredit, other: firstCredit, outOf } }
    : { one: first, other: second, credits: { one: firstCredit, other: secondCredit, outOf } };
}

function byGraders(pairs: readonly Oriented[]): Oriented[][] {
  const groups = new Map<string, Oriented[]>();
  for (const pair of pairs) {
    const key = `${pair.one.id} ${pair.other.id}`;
    groups.set(key, [...(groups.get(key) ?? []), pair]);
  }
  return [...groups.values()];
}

function rowOf(id: string, name: string, group: readonly Oriented[], tolerance: number): ConsistencyRow {
  const credits = group.map((pair) => pair.credits);
  return {
    id,
    name,
    agreement: markingAgreement(credits),
    apart: credits.filter(({ one, other, outOf }) => differBeyondTolerance(one, other, outOf, tolerance)).length,
  };
}

function presentToSettle(pair: PairOfMarkings): ToSettle {
  return {
    secondMarkingId: pair.secondMarkingId,
    where: `Question ${pair.question}, part ${pair.partKey}`,
    credits: `${formatCredit(pair.firstCredit)} and ${formatCredit(pair.secondCredit)} of ${formatCredit(pair.outOf)}`,
  };
}
